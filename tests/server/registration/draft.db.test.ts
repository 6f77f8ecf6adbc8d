import { describe, expect, test } from 'vitest';
import { camp } from '@/db/schema/camp';
import { draft, order, registration, registrationNeeds } from '@/db/schema/order';
import { meeting, workshop } from '@/db/schema/workshop';
import { countPlaces } from '@/lib/server/registration/count-places';
import { findDraft } from '@/lib/server/registration/find-draft';
import { holdPlaces } from '@/lib/server/registration/hold-places';
import { purgeDrafts } from '@/lib/server/registration/purge-drafts';
import { purgeNeeds } from '@/lib/server/registration/purge-needs';
import { saveAnswer } from '@/lib/server/registration/save-answer';
import { buildCamp, NOW } from '@/tests/builders/build-camp';
import { answersFor } from '@/tests/builders/build-draft';
import { useTestDatabase } from '@/tests/setup/test-database';

const at = useTestDatabase();
const DAY = 24 * 60 * 60_000;

describe('a draft', () => {
  test('is found by its token only, of which the database keeps a hash', () => {
    const { campId, benders } = buildCamp(at.db);
    const { who, track } = answersFor(benders);
    const saved = saveAnswer(null, campId, { who }, NOW);
    expect(saved?.token.length).toBeGreaterThanOrEqual(27);
    const [row] = at.db.select().from(draft).all();
    expect(JSON.stringify(row)).not.toContain(saved?.token);
    saveAnswer(saved?.token ?? null, campId, { track }, NOW + 1);
    expect(findDraft(saved?.token ?? null, campId)?.answers).toEqual({ who, track });
    expect(findDraft('guess', campId)).toBeNull();
    expect(findDraft(null, campId)).toBeNull();
    expect(findDraft(saved?.token ?? null, 'cmp_other')).toBeNull();
  });

  test('a token that we never made is not taken over', () => {
    const { campId, benders } = buildCamp(at.db);
    const { who } = answersFor(benders);
    expect(saveAnswer('planted-by-somebody', campId, { who }, NOW)?.token).not.toBe('planted-by-somebody');
    expect(findDraft('planted-by-somebody', campId)).toBeNull();
  });

  test('one browser keeps answers for two camps apart', () => {
    const { campId, benders } = buildCamp(at.db);
    buildCamp(at.db, { id: 'cmp_2' });
    const { who } = answersFor(benders);
    const token = saveAnswer(null, campId, { who }, NOW)?.token ?? null;
    expect(saveAnswer(token, 'cmp_2', { harps: { harpIds: [] } }, NOW)?.token).toBe(token);
    expect(findDraft(token, campId)?.answers).toEqual({ who });
    expect(findDraft(token, 'cmp_2')?.answers).toEqual({ harps: { harpIds: [] } });
  });

  test('changes nothing while its order is held, and begins anew for the next person afterwards', () => {
    const { campId, benders } = buildCamp(at.db);
    const { who, ...rest } = answersFor(benders);
    const token = saveAnswer(null, campId, { who, ...rest }, NOW)?.token ?? null;
    expect(holdPlaces(token, campId, null, NOW)).toMatchObject({ ok: true });
    expect(saveAnswer(token, campId, { who: { ...who, attendeeName: 'Else' } }, NOW)).toBeNull();
    at.db.update(order).set({ state: 'confirmed' }).run();
    saveAnswer(token, campId, { who: { ...who, attendeeName: 'Else' } }, NOW);
    expect(findDraft(token, campId)).toMatchObject({
      answers: { who: { attendeeName: 'Else' } },
      order: null,
    });
    expect(Object.keys(findDraft(token, campId)?.answers ?? {})).toEqual(['who']);
  });

  test('is deleted when nobody came back for 14 days', () => {
    const { campId, benders } = buildCamp(at.db);
    saveAnswer(null, campId, { who: answersFor(benders).who }, NOW);
    expect(purgeDrafts(NOW + 14 * DAY)).toBe(0);
    expect(purgeDrafts(NOW + 14 * DAY + 1)).toBe(1);
    expect(at.db.select().from(draft).all()).toEqual([]);
  });
});

describe('food, access and contacts', () => {
  function registered() {
    const { campId, benders } = buildCamp(at.db);
    const token = saveAnswer(null, campId, answersFor(benders, { minor: true }), NOW)?.token ?? null;
    holdPlaces(token, campId, null, NOW);
  }
  const blank = {
    diet: '',
    access: '',
    emergencyName: '',
    emergencyPhone: '',
    guardianName: '',
    guardianPhone: '',
  };

  test('are deleted 30 days after the camp, and not before; that consent was given stays', () => {
    registered();
    const [ends] = at.db.select({ on: camp.endsOn }).from(camp).all();
    const end = Date.parse(`${ends?.on}T00:00:00Z`);
    expect(purgeNeeds(end + 30 * DAY)).toBe(0);
    expect(purgeNeeds(end + 31 * DAY)).toBe(1);
    expect(at.db.select().from(registrationNeeds).get()).toMatchObject({ ...blank, consentAt: NOW });
    expect(purgeNeeds(end + 32 * DAY)).toBe(0);
  });

  test('of a hold that ran out, 30 days after it', () => {
    registered();
    at.db.update(camp).set({ endsOn: '2099-01-01' }).run();
    at.db.update(registration).set({ state: 'expired', updatedAt: NOW }).run();
    expect(purgeNeeds(NOW + 30 * DAY)).toBe(0);
    expect(purgeNeeds(NOW + 30 * DAY + 1)).toBe(1);
  });
});

test('an elective without a limit takes as many as its smallest room seats', () => {
  const { campId, hall, barn } = buildCamp(at.db);
  const elective = (id: 'wsh_a' | 'wsh_b' | 'wsh_c', capacity: number | null) =>
    ({ id, campId, title: id, kind: 'jam', audience: 'elective', lengthMinutes: 60, capacity }) as const;
  at.db
    .insert(workshop)
    .values([elective('wsh_a', null), elective('wsh_b', 7), elective('wsh_c', null)])
    .run();
  const meets = (
    id: 'mtg_1' | 'mtg_2' | 'mtg_3',
    workshopId: 'wsh_a' | 'wsh_b',
    roomId: typeof hall | typeof barn,
  ) =>
    ({
      id,
      campId,
      workshopId,
      roomId,
      day: '2026-06-08',
      starts: '10:00',
      lengthMinutes: 60,
      updatedAt: NOW,
    }) as const;
  at.db
    .insert(meeting)
    .values([meets('mtg_1', 'wsh_a', hall), meets('mtg_2', 'wsh_a', barn), meets('mtg_3', 'wsh_b', barn)])
    .run();
  expect(countPlaces(campId)?.electives.map(({ id, places }) => [id, places.capacity])).toEqual([
    ['wsh_a', 20],
    ['wsh_b', 7],
  ]);
});
