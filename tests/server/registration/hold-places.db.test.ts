import { eq } from 'drizzle-orm';
import { describe, expect, test } from 'vitest';
import { camp, track } from '@/db/schema/camp';
import { mail } from '@/db/schema/mail';
import { ledger } from '@/db/schema/money';
import { draft, order, orderLine, registration, registrationNeeds, ticket } from '@/db/schema/order';
import { workshop } from '@/db/schema/workshop';
import { minor } from '@/lib/domain/shared/money';
import { countPlaces } from '@/lib/server/registration/count-places';
import { holdPlaces } from '@/lib/server/registration/hold-places';
import { buildCamp, NOW } from '@/tests/builders/build-camp';
import { answersFor, buildDraft } from '@/tests/builders/build-draft';
import { useTestDatabase } from '@/tests/setup/test-database';

const at = useTestDatabase();
const MINUTE = 60_000;

function hold(token: string, answers: object, campId = 'cmp_1' as const) {
  buildDraft(at.db, { token, campId, answers });
  return holdPlaces(token, campId, null, NOW);
}

describe('a hold', () => {
  test('writes order, line, attendee and needs, and empties the draft', () => {
    const { campId, benders } = buildCamp(at.db);
    const held = hold('a', answersFor(benders));
    expect(held).toMatchObject({ ok: true });
    const row = at.db.select().from(order).get();
    expect(row).toMatchObject({
      state: 'held',
      total: 46_000,
      currency: 'EUR',
      payerName: 'Noor Haddad',
      payerEmail: 'noor@example.test',
      refundTerms: 'Until 60 days before: all but 50 EUR.',
      heldUntil: NOW + 20 * MINUTE,
    });
    expect(row?.reference).toMatch(/^[2-9B-DF-HJKMNP-TV-Z]{8}$/);
    expect(at.db.select().from(orderLine).all()).toMatchObject([
      { label: 'Kettle Lake Harp Week, Bending', unit: 46_000, quantity: 1, amount: 46_000 },
    ]);
    expect(at.db.select().from(registration).get()).toMatchObject({
      state: 'held',
      attendeeSearch: 'noor haddad',
    });
    expect(at.db.select().from(registrationNeeds).get()).toMatchObject({
      diet: 'No peanuts',
      consentAt: null,
    });
    expect(at.db.select().from(draft).get()).toMatchObject({ answers: {}, orderId: row?.id });
    expect(countPlaces(campId)?.camp).toEqual({ capacity: 60, taken: 1, left: 59 });
    expect(at.db.select().from(ticket).all()).toEqual([]);
    expect(at.db.select().from(mail).all()).toEqual([]);
  });

  test('pressed twice finds the same order', () => {
    const { campId, benders } = buildCamp(at.db);
    const first = hold('a', answersFor(benders));
    expect(holdPlaces('a', campId, null, NOW + 1)).toEqual(first);
    expect(at.db.select().from(order).all()).toHaveLength(1);
  });

  test('what costs nothing is confirmed at once, with a ticket and no ledger rows', () => {
    const { benders } = buildCamp(at.db, { price: minor(0) });
    hold('a', answersFor(benders));
    expect(at.db.select().from(order).get()).toMatchObject({ state: 'confirmed', heldUntil: null });
    expect(at.db.select().from(ticket).all()).toHaveLength(1);
    expect(at.db.select().from(ledger).all()).toEqual([]);
    expect(
      at.db
        .select()
        .from(mail)
        .all()
        .map(({ kind }) => kind),
    ).toEqual(['order-confirmed', 'packing-list']);
  });

  test('a minor’s guardian and consent are kept word for word', () => {
    const { benders } = buildCamp(at.db);
    hold('a', answersFor(benders, { minor: true }));
    expect(at.db.select().from(registrationNeeds).get()).toMatchObject({
      guardianName: 'Sami Haddad',
      consentAt: NOW,
      consentText: expect.stringContaining('parent or guardian'),
    });
  });
});

describe('a hold is refused, and nothing is written', () => {
  const nothing = () => {
    expect(
      at.db
        .select()
        .from(order)
        .all()
        .filter(({ payerEmail }) => payerEmail === 'late@example.test'),
    ).toEqual([]);
    expect(
      at.db
        .select()
        .from(draft)
        .all()
        .some(({ answers }) => 'who' in answers),
    ).toBe(true);
  };
  test('when the camp is full', () => {
    const { benders, beginners } = buildCamp(at.db, { capacity: 1 });
    hold('a', answersFor(benders));
    expect(hold('b', answersFor(beginners, { email: 'late@example.test' }))).toEqual({
      ok: false,
      error: { code: 'camp_full', left: 0 },
    });
    nothing();
  });
  test('when the track is full', () => {
    const { benders } = buildCamp(at.db);
    at.db.update(track).set({ capacity: 1 }).where(eq(track.id, benders)).run();
    hold('a', answersFor(benders));
    expect(hold('b', answersFor(benders, { email: 'late@example.test' }))).toMatchObject({
      error: { code: 'track_full', trackId: benders },
    });
    nothing();
  });
  test('when an elective is full', () => {
    const { benders, campId } = buildCamp(at.db);
    at.db
      .insert(workshop)
      .values({
        id: 'wsh_e',
        campId,
        title: 'Reed repair',
        kind: 'repair-bench',
        audience: 'elective',
        lengthMinutes: 60,
        capacity: 1,
      })
      .run();
    hold('a', answersFor(benders, { electives: ['wsh_e'] }));
    expect(
      hold('b', answersFor(benders, { electives: ['wsh_e'], email: 'late@example.test' })),
    ).toMatchObject({
      error: { code: 'elective_full', workshopId: 'wsh_e' },
    });
    nothing();
  });
  test.each([
    ['closed', { state: 'closed' as const }, 'closed'],
    ['a draft', { state: 'draft' as const }, 'draft'],
    ['begun', { startsOn: '2026-04-29' }, 'begun'],
    ['without a price', { price: null }, 'no_price'],
  ])('when the camp is %s', (_what, overrides, sale) => {
    const { benders } = buildCamp(at.db);
    at.db.update(camp).set(overrides).run();
    expect(hold('b', answersFor(benders, { email: 'late@example.test' }))).toEqual({
      ok: false,
      error: { code: 'camp_closed', sale },
    });
    nothing();
  });
  test('when a step is missing, or a minor has no guardian (ASVS 2.3.1)', () => {
    const { benders } = buildCamp(at.db);
    const { harps: _left, ...rest } = answersFor(benders, { email: 'late@example.test' });
    expect(hold('b', rest)).toMatchObject({ error: { code: 'unanswered', step: 'harps' } });
    const grown = answersFor(benders, { email: 'late@example.test' });
    expect(hold('c', { ...grown, who: { ...grown.who, minor: true } })).toMatchObject({
      error: { code: 'unanswered', step: 'needs' },
    });
    nothing();
  });
  test('when there is no such draft', () => {
    buildCamp(at.db);
    expect(holdPlaces('nobody', 'cmp_1', null, NOW)).toMatchObject({
      error: { code: 'unanswered', step: 'who' },
    });
    expect(holdPlaces(null, 'cmp_1', null, NOW)).toMatchObject({
      error: { code: 'unanswered', step: 'who' },
    });
  });
});

test('a place can be had again once it was cancelled', () => {
  const { benders, campId } = buildCamp(at.db, { capacity: 1 });
  hold('a', answersFor(benders));
  at.db.update(registration).set({ state: 'cancelled' }).run();
  expect(countPlaces(campId)?.camp.left).toBe(1);
  expect(hold('b', answersFor(benders))).toMatchObject({ ok: true });
});
