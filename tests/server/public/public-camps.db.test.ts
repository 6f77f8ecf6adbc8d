import { eq } from 'drizzle-orm';
import { describe, expect, test } from 'vitest';
import { camp } from '@/db/schema/camp';
import { getPublicCamp } from '@/lib/server/camps/get-public-camp';
import { listPublicCamps } from '@/lib/server/camps/list-public-camps';
import { buildCamp } from '../../builders/build-camp';
import { buildRegistration } from '../../builders/build-registration';
import { useTestDatabase } from '../../setup/test-database';

const at = useTestDatabase();
// Noon in Berlin on the camp's second day.
const DURING = Date.UTC(2026, 5, 9, 10);
const BEFORE = Date.UTC(2026, 4, 1);
const AFTER = Date.UTC(2026, 5, 12, 22, 30);

describe('camps that the public sees', () => {
  test('a draft is as absent as a slug that never was', () => {
    buildCamp(at.db, { state: 'draft' });
    expect(listPublicCamps(BEFORE)).toEqual({ coming: [], past: [] });
    expect(getPublicCamp('kettle-lake-1')).toBeNull();
    expect(getPublicCamp('no-such-camp')).toBeNull();
  });

  test('published and closed camps are there, each with its own places', () => {
    const one = buildCamp(at.db);
    buildCamp(at.db, { id: 'cmp_2', state: 'closed', startsOn: '2026-07-01', endsOn: '2026-07-03' });
    buildRegistration(at.db, { ...one, trackId: one.beginners, code: 'a' });
    buildRegistration(at.db, { ...one, trackId: one.benders, code: 'b', state: 'held' });
    buildRegistration(at.db, { ...one, trackId: one.benders, code: 'c', state: 'cancelled' });
    const { coming } = listPublicCamps(BEFORE);
    expect(coming.map(({ slug, standing, places }) => [slug, standing, places.left])).toEqual([
      ['kettle-lake-1', 'open', 58],
      ['kettle-lake-2', 'closed', 60],
    ]);
    const found = getPublicCamp('kettle-lake-1');
    expect(found?.places.tracks.map(({ places }) => places.left)).toEqual([39, 39]);
  });

  test('a camp is past once its last day is over where it is, and not an hour sooner', () => {
    buildCamp(at.db);
    expect(listPublicCamps(DURING).coming.map(({ standing }) => standing)).toEqual(['begun']);
    // 23:30 and 00:30 in Berlin.
    expect(listPublicCamps(AFTER - 3_600_000).past).toHaveLength(0);
    expect(listPublicCamps(AFTER).past).toHaveLength(1);
  });

  test('a camp is full when its tracks are, even with places left in the camp', () => {
    const ids = buildCamp(at.db, { capacity: 500 });
    for (let n = 0; n < 80; n++)
      buildRegistration(at.db, { ...ids, trackId: n % 2 ? ids.benders : ids.beginners, code: `n${n}` });
    expect(listPublicCamps(BEFORE).coming[0]).toMatchObject({ standing: 'full', places: { left: 0 } });
  });

  test('reads the same number of statements for one camp and for thirty', () => {
    const count = (run: () => unknown): number => {
      let statements = 0;
      const client = at.db.$client;
      const prepare = client.prepare;
      client.prepare = ((sql: string) => {
        statements += 1;
        return prepare.call(client, sql);
      }) as typeof prepare;
      run();
      client.prepare = prepare;
      return statements;
    };
    buildCamp(at.db);
    const one = count(() => listPublicCamps(BEFORE));
    for (let n = 2; n <= 30; n++) buildCamp(at.db, { id: `cmp_${n}` });
    expect(count(() => listPublicCamps(BEFORE))).toBe(one);
    expect(one).toBe(3);
    expect(listPublicCamps(BEFORE).coming).toHaveLength(30);
  });

  test('an undecided price is no price, and a track may cost less', () => {
    buildCamp(at.db, { price: null });
    expect(listPublicCamps(BEFORE).coming[0]?.price).toBeNull();
    at.db.update(camp).set({ state: 'draft' }).where(eq(camp.id, 'cmp_1')).run();
    expect(listPublicCamps(BEFORE).coming).toEqual([]);
  });
});
