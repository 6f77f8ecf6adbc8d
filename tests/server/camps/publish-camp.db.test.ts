import { eq } from 'drizzle-orm';
import { beforeEach, expect, test } from 'vitest';
import { audit } from '@/db/schema/audit';
import { camp, track } from '@/db/schema/camp';
import { meeting } from '@/db/schema/workshop';
import { closeCamp } from '@/lib/server/camps/close-camp';
import { publishCamp } from '@/lib/server/camps/publish-camp';
import { buildCamp, NOW } from '../../builders/build-camp';
import { buildUser } from '../../builders/build-user';
import { buildWorkshop } from '../../builders/build-workshop';
import { staff } from '../../builders/staff';
import { useTestDatabase } from '../../setup/test-database';

const held = useTestDatabase();
const context = { actor: staff('organiser'), now: NOW };
const state = () => held.db.select().from(camp).where(eq(camp.id, 'cmp_1')).get()?.state;

beforeEach(() => {
  buildCamp(held.db, { state: 'draft', publishedAt: null });
  buildUser(held.db, { id: 'usr_organiser', roles: ['organiser'] });
  const workshopId = buildWorkshop(held.db, { id: 'wsh_1a', trackIds: ['trk_1a', 'trk_1b'] });
  held.db
    .insert(meeting)
    .values({
      id: 'mtg_1',
      campId: 'cmp_1',
      workshopId,
      roomId: 'rom_1b',
      day: '2026-06-09',
      starts: '09:30',
      lengthMinutes: 75,
      updatedAt: NOW,
    })
    .run();
});

test('draft → on sale → closed → on sale again, each noted', () => {
  expect(publishCamp('cmp_1', context).ok).toBe(true);
  expect(state()).toBe('published');
  expect(publishCamp('cmp_1', context)).toMatchObject({ ok: false, error: { code: 'stale' } });
  expect(closeCamp('cmp_1', { ...context, now: NOW + 1 }).ok).toBe(true);
  expect(state()).toBe('closed');
  expect(closeCamp('cmp_1', context)).toMatchObject({ ok: false, error: { code: 'stale' } });
  expect(publishCamp('cmp_1', { ...context, now: NOW + 2 }).ok).toBe(true);
  expect(held.db.select().from(camp).get()).toMatchObject({
    state: 'published',
    publishedAt: NOW,
    closedAt: null,
  });
  expect(
    held.db
      .select()
      .from(audit)
      .orderBy(audit.at)
      .all()
      .map(({ action }) => action),
  ).toEqual(['camp.publish', 'camp.close', 'camp.reopen']);
});

test('what was mended away since the page was read is found inside the transaction', () => {
  held.db.update(track).set({ gate: '' }).where(eq(track.id, 'trk_1a')).run();
  const refused = publishCamp('cmp_1', context);
  expect(refused).toMatchObject({ ok: false, error: { code: 'not_ready' } });
  expect(!refused.ok && refused.error.sentence).toMatch(/First breath has no gate/);
  expect(state()).toBe('draft');
});

test('a camp that is over cannot be put on sale', () => {
  const after = publishCamp('cmp_1', { ...context, now: Date.UTC(2026, 5, 13) });
  expect(!after.ok && after.error.sentence).toMatch(/ended on 2026-06-12/);
});
