import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';
import { openDatabase } from '@/db/client';
import { camp } from '@/db/schema/camp';
import { keepProgramme } from '@/lib/server/camps/keep-programme';
import { buildCamp } from '../../builders/build-camp';
import { useTestDatabase } from '../../setup/test-database';

const at = useTestDatabase();

test('a programme is worked out once while nothing is written, and anew after any write', () => {
  const { campId } = buildCamp(at.db);
  const first = keepProgramme(campId);
  expect(first?.harps.size).toBe(2);
  expect(keepProgramme(campId)?.programme).toBe(first?.programme);
  at.db.update(camp).set({ name: 'Renamed here' }).where(eq(camp.id, campId)).run();
  expect(keepProgramme(campId)?.programme.camp.name).toBe('Renamed here');
});

test('a write by another process is seen at once', () => {
  const { campId } = buildCamp(at.db);
  keepProgramme(campId);
  const other = openDatabase(at.file);
  other.update(camp).set({ name: 'Renamed elsewhere' }).where(eq(camp.id, campId)).run();
  other.$client.close();
  expect(keepProgramme(campId)?.programme.camp.name).toBe('Renamed elsewhere');
});

test('an unknown camp is none', () => {
  expect(keepProgramme('cmp_none')).toBeNull();
});
