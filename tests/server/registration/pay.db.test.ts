import { afterAll, afterEach, describe, expect, test } from 'vitest';
import { mail } from '@/db/schema/mail';
import { ledger, payment, paymentEvent, receipt, refund } from '@/db/schema/money';
import { order, registration, ticket } from '@/db/schema/order';
import { checkBooks } from '@/lib/server/orders/check-books';
import { applySession } from '@/lib/server/registration/apply-session';
import { countPlaces } from '@/lib/server/registration/count-places';
import { holdPlaces } from '@/lib/server/registration/hold-places';
import { reconcileOrder, reconcilePayments } from '@/lib/server/registration/reconcile-payments';
import { reopenAnswers } from '@/lib/server/registration/reopen-answers';
import { sendRefunds } from '@/lib/server/registration/send-refunds';
import { startPayment } from '@/lib/server/registration/start-payment';
import { sweepHolds } from '@/lib/server/registration/sweep-holds';
import { answersFor, buildDraft } from '@/tests/builders/build-draft';
import {
  buildFarCamp,
  deliver,
  heldOrder,
  openDesk,
  pressPay,
  stateOf,
} from '@/tests/builders/checkout-desk';
import { useTestDatabase } from '@/tests/setup/test-database';

const at = useTestDatabase();
const desk = await openDesk();
const NOW = Date.now();
const MINUTE = 60_000;
const AFTER_HOLD = NOW + 21 * MINUTE;

afterEach(async () => {
  expect(checkBooks(at.db)).toEqual([]);
  await desk.control('reset');
});
afterAll(() => desk.mock.close());

const deliverAll = async (now = NOW) => {
  for (const event of await desk.events()) expect((await deliver(event, now)).status).toBe(200);
};
const kinds = () =>
  at.db
    .select()
    .from(mail)
    .all()
    .map(({ kind }) => kind);

describe('paying', () => {
  test('confirms the order, with one ticket, receipt 1, four ledger rows and the mails, and events again change nothing', async () => {
    buildFarCamp(at.db);
    const id = heldOrder(at.db, NOW);
    await desk.play(await pressPay(at.db, id, NOW));
    await deliverAll();
    const settled = () => ({
      order: at.db.select().from(order).get(),
      tickets: at.db.select().from(ticket).all().length,
      receipts: at.db.select().from(receipt).all(),
      ledger: at.db
        .select()
        .from(ledger)
        .all()
        .map(({ account, amount, memo }) => [memo, account, amount]),
      mails: kinds(),
    });
    const first = settled();
    expect(first).toMatchObject({
      order: { state: 'confirmed', heldUntil: null, confirmedAt: NOW },
      tickets: 1,
      receipts: [{ number: 1, amount: 46_000, currency: 'EUR' }],
      ledger: [
        ['Paid by card', 'provider', 46_000],
        ['Paid by card', 'payers', -46_000],
        ['Place sold', 'payers', 46_000],
        ['Place sold', 'income', -46_000],
      ],
      mails: ['order-confirmed', 'packing-list'],
    });
    for (let times = 0; times < 10; times += 1) await deliverAll(NOW + times);
    expect(settled()).toEqual(first);
    expect(at.db.select().from(registration).get()).toMatchObject({ state: 'confirmed' });
  });

  test('pressing Pay again, or in another tab, leads to the same session', async () => {
    buildFarCamp(at.db);
    const id = heldOrder(at.db, NOW);
    const [first, second] = await Promise.all([startPayment(id, NOW), startPayment(id, NOW + 5)]);
    expect(first).toMatchObject({ ok: true, value: { go: 'provider' } });
    expect(second).toEqual(first);
    expect(await startPayment(id, NOW + MINUTE)).toEqual(first);
    expect(await desk.sessions()).toHaveLength(1);
    expect(at.db.select().from(payment).all()).toHaveLength(1);
  });

  test('a payer who is back before the webhook is confirmed by asking; the webhook then finds it done', async () => {
    buildFarCamp(at.db);
    const id = heldOrder(at.db, NOW);
    await desk.play(await pressPay(at.db, id, NOW));
    // Asked again within two seconds it keeps still: a page loaded over and over costs the provider nothing.
    await reconcileOrder(id, NOW + 1_999);
    expect(stateOf(at.db, id)).toBe('held');
    await reconcileOrder(id, NOW + 2_000);
    expect(stateOf(at.db, id)).toBe('confirmed');
    await deliverAll();
    expect(at.db.select().from(receipt).all()).toHaveLength(1);
    expect(
      at.db
        .select()
        .from(paymentEvent)
        .all()
        .some(({ outcome }) => outcome === 'applied'),
    ).toBe(false);
    // Pressing Pay in a tab left open leads on, not to a second payment.
    expect(await startPayment(id, NOW)).toEqual({ ok: true, value: { go: 'paid' } });
  });

  test('all webhooks lost: the reconciliation repairs it (assurance: lost webhooks)', async () => {
    buildFarCamp(at.db);
    const id = heldOrder(at.db, NOW);
    await desk.play(await pressPay(at.db, id, NOW));
    expect(await reconcilePayments(NOW + 30_000)).toBe(0);
    expect(await reconcilePayments(NOW + 2 * MINUTE)).toBe(1);
    expect(stateOf(at.db, id)).toBe('confirmed');
  });

  test('declined, then walked away: still held, and Pay leads back to the same session', async () => {
    buildFarCamp(at.db);
    const id = heldOrder(at.db, NOW);
    const session = await pressPay(at.db, id, NOW);
    await desk.play(session, 'decline');
    await deliverAll();
    expect(stateOf(at.db, id)).toBe('held');
    expect(await pressPay(at.db, id, NOW + MINUTE)).toBe(session);
  });

  test('a slow method holds the place past the time, and its end decides', async () => {
    buildFarCamp(at.db);
    const [one, two] = [heldOrder(at.db, NOW, 'one'), heldOrder(at.db, NOW, 'two')];
    const [first, second] = [await pressPay(at.db, one, NOW), await pressPay(at.db, two, NOW)];
    await desk.play(first, 'pay-later');
    await desk.play(second, 'pay-later');
    await deliverAll();
    await sweepHolds(AFTER_HOLD);
    expect([stateOf(at.db, one), stateOf(at.db, two)]).toEqual(['held', 'held']);
    await desk.control(`sessions/${first}/settle`, { status: 'succeeded' });
    await desk.control(`sessions/${second}/settle`, { status: 'failed' });
    // The failure's webhook is lost: asking finds it.
    await reconcilePayments(AFTER_HOLD);
    expect([stateOf(at.db, one), stateOf(at.db, two)]).toEqual(['confirmed', 'expired']);
    await deliverAll(AFTER_HOLD);
    expect([stateOf(at.db, one), stateOf(at.db, two)]).toEqual(['confirmed', 'expired']);
  });
});

describe('the payment service fails', () => {
  test('an error: words, the place stays held, and the next press works', async () => {
    buildFarCamp(at.db);
    const id = heldOrder(at.db, NOW);
    await desk.control('faults', { kind: 'server-error', count: 2, path: '/v1/checkout/sessions' });
    expect(await startPayment(id, NOW)).toEqual({ ok: false, error: 'payment_down' });
    expect(stateOf(at.db, id)).toBe('held');
    expect(at.db.select().from(payment).all()).toMatchObject([{ state: 'opening', sessionId: null }]);
    expect(await startPayment(id, NOW + 1)).toMatchObject({ ok: true });
    expect(await desk.sessions()).toHaveLength(1);
  });

  test('a crash after the provider made the session and before we noted it: the same session is found', async () => {
    buildFarCamp(at.db);
    const id = heldOrder(at.db, NOW);
    const made = await pressPay(at.db, id, NOW);
    at.db.update(payment).set({ state: 'opening', sessionId: null, url: null }).run();
    expect(await pressPay(at.db, id, NOW + MINUTE)).toBe(made);
    expect(await desk.sessions()).toHaveLength(1);
  });

  test('a crash there, then the webhook: the payment is found by its name in the session', async () => {
    buildFarCamp(at.db);
    const id = heldOrder(at.db, NOW);
    await desk.play(await pressPay(at.db, id, NOW));
    at.db.update(payment).set({ state: 'opening', sessionId: null, url: null }).run();
    await deliverAll();
    expect(stateOf(at.db, id)).toBe('confirmed');
  });

  test('a crash there, and the hold runs out: the session is found and ended', async () => {
    buildFarCamp(at.db);
    const id = heldOrder(at.db, NOW);
    await pressPay(at.db, id, NOW);
    at.db.update(payment).set({ state: 'opening', sessionId: null, url: null }).run();
    await sweepHolds(AFTER_HOLD);
    expect(stateOf(at.db, id)).toBe('expired');
    expect(await desk.sessions()).toMatchObject([{ status: 'expired' }]);
  });
});

describe('the hold runs out', () => {
  test('the session is ended and the place goes back', async () => {
    const { campId } = buildFarCamp(at.db, { capacity: 1 });
    const id = heldOrder(at.db, NOW);
    const session = await pressPay(at.db, id, NOW);
    expect(await sweepHolds(NOW + 19 * MINUTE)).toBe(0);
    expect(countPlaces(campId)?.camp.left).toBe(0);
    await sweepHolds(AFTER_HOLD);
    expect(stateOf(at.db, id)).toBe('expired');
    expect(at.db.select().from(registration).get()).toMatchObject({ state: 'expired' });
    expect(countPlaces(campId)?.camp.left).toBe(1);
    await expect(desk.play(session)).rejects.toThrow('409');
    expect(await startPayment(id, AFTER_HOLD)).toEqual({ ok: false, error: 'hold_over' });
    await deliverAll(AFTER_HOLD);
    expect(stateOf(at.db, id)).toBe('expired');
  });

  test('while somebody pays: the provider’s refusal to end the session means that the payment won', async () => {
    buildFarCamp(at.db);
    const id = heldOrder(at.db, NOW);
    await desk.play(await pressPay(at.db, id, NOW));
    await sweepHolds(AFTER_HOLD);
    expect(stateOf(at.db, id)).toBe('confirmed');
  });

  test('while the provider is down: the place stays taken until it answers', async () => {
    const { campId } = buildFarCamp(at.db);
    const id = heldOrder(at.db, NOW);
    await pressPay(at.db, id, NOW);
    await desk.control('faults', { kind: 'server-error', count: 2 });
    await sweepHolds(AFTER_HOLD);
    expect(stateOf(at.db, id)).toBe('held');
    expect(countPlaces(campId)?.camp.taken).toBe(1);
    await sweepHolds(AFTER_HOLD + 1);
    expect(stateOf(at.db, id)).toBe('expired');
  });

  test('a session that the provider does not know keeps its own place taken, and nobody else’s', async () => {
    buildFarCamp(at.db);
    const lost = heldOrder(at.db, NOW, 'lost');
    await pressPay(at.db, lost, NOW);
    await desk.control('reset');
    const next = heldOrder(at.db, NOW + 1, 'next');
    await pressPay(at.db, next, NOW + 1);
    await sweepHolds(AFTER_HOLD + 1);
    expect([stateOf(at.db, lost), stateOf(at.db, next)]).toEqual(['held', 'expired']);
  });

  test('the same answers can be used to try again, also to change them while it runs', async () => {
    const { benders } = buildFarCamp(at.db, { capacity: 1 });
    const id = heldOrder(at.db, NOW, 'browser');
    const session = await pressPay(at.db, id, NOW);
    const reopened = await reopenAnswers(id, 'browser', NOW + MINUTE);
    expect(reopened).toEqual({ ok: true, value: 'browser' });
    expect(await desk.sessions()).toMatchObject([{ id: session, status: 'expired' }]);
    const again = holdPlaces('browser', 'cmp_1', null, NOW + MINUTE);
    expect(again).toMatchObject({ ok: true });
    const people = at.db.select().from(registration).all();
    expect(people.map(({ state, trackId, attendeeEmail }) => [state, trackId, attendeeEmail])).toEqual([
      ['expired', benders, 'browser@example.test'],
      ['held', benders, 'browser@example.test'],
    ]);
  });

  test('what is paid already is not given back by a tab that was left open', async () => {
    buildFarCamp(at.db);
    const id = heldOrder(at.db, NOW);
    await desk.play(await pressPay(at.db, id, NOW));
    expect(await reopenAnswers(id, 'browser', NOW)).toEqual({ ok: false, error: 'paid' });
    expect(stateOf(at.db, id)).toBe('confirmed');
  });
});

describe('money that arrives after the place went back', () => {
  /** As if the provider had let a session be paid that we took for ended. */
  async function latePayment(capacity: number) {
    buildFarCamp(at.db, { capacity });
    const id = heldOrder(at.db, NOW, 'late');
    const session = await pressPay(at.db, id, NOW);
    at.db.update(payment).set({ state: 'expired' }).run();
    await sweepHolds(AFTER_HOLD);
    expect(stateOf(at.db, id)).toBe('expired');
    return { id, session };
  }

  test('seats again while a place is left', async () => {
    const { id, session } = await latePayment(1);
    await desk.play(session);
    await deliverAll(AFTER_HOLD);
    expect(stateOf(at.db, id)).toBe('confirmed');
    expect(at.db.select().from(ticket).all()).toHaveLength(1);
    expect(at.db.select().from(refund).all()).toEqual([]);
  });

  test('goes back in full when none is left, once, and the payer is told', async () => {
    const { id, session } = await latePayment(1);
    buildDraft(at.db, { token: 'quick', campId: 'cmp_1', answers: answersFor('trk_1b'), now: NOW });
    expect(holdPlaces('quick', 'cmp_1', null, AFTER_HOLD)).toMatchObject({ ok: true });
    await desk.play(session);
    await deliverAll(AFTER_HOLD);
    expect(stateOf(at.db, id)).toBe('expired');
    expect(kinds()).toEqual(['late-payment']);
    expect(at.db.select().from(refund).all()).toMatchObject([{ state: 'owed', amount: 46_000 }]);
    expect(await sendRefunds(AFTER_HOLD)).toBe(1);
    expect(await sendRefunds(AFTER_HOLD + MINUTE)).toBe(0);
    await deliverAll(AFTER_HOLD);
    expect(at.db.select().from(refund).all()).toMatchObject([{ state: 'succeeded' }]);
    const sums = at.db.$client
      .prepare('select account, sum(amount) as sum from ledger group by account order by account')
      .all();
    expect(sums).toEqual([
      { account: 'payers', sum: 0 },
      { account: 'provider', sum: 0 },
    ]);
  });

  test('paid twice in two sessions: the second goes back', async () => {
    buildFarCamp(at.db);
    const id = heldOrder(at.db, NOW);
    const first = await pressPay(at.db, id, NOW);
    at.db.update(payment).set({ state: 'expired' }).run();
    const second = await pressPay(at.db, id, NOW + 1);
    expect(second).not.toBe(first);
    await desk.play(first);
    await desk.play(second);
    await deliverAll();
    expect(stateOf(at.db, id)).toBe('confirmed');
    expect(at.db.select().from(refund).all()).toMatchObject([{ state: 'owed', reason: 'Paid twice' }]);
    expect(at.db.select().from(ticket).all()).toHaveLength(1);
    await sendRefunds(NOW);
    expect(at.db.select().from(refund).all()).toMatchObject([{ state: 'succeeded' }]);
  });
});

describe('refunds', () => {
  async function owed() {
    buildFarCamp(at.db);
    const id = heldOrder(at.db, NOW);
    const first = await pressPay(at.db, id, NOW);
    at.db.update(payment).set({ state: 'expired' }).run();
    await desk.play(first);
    await desk.play(await pressPay(at.db, id, NOW + 1));
    await deliverAll();
  }

  test('a refund that is slow at the bank is booked when it is through', async () => {
    await owed();
    await desk.control('faults', { kind: 'refund-pending', path: '/v1/refunds' });
    await sendRefunds(NOW);
    const [row] = at.db.select().from(refund).all();
    expect(row).toMatchObject({ state: 'pending' });
    await desk.control(`refunds/${row?.providerRefundId}/settle`, { status: 'succeeded' });
    expect(await reconcilePayments(NOW + 2 * MINUTE)).toBe(1);
    expect(at.db.select().from(refund).all()).toMatchObject([{ state: 'succeeded' }]);
  });

  test('one that fails is owed again by a new row, and goes then', async () => {
    await owed();
    await desk.control('faults', { kind: 'refund-fails', path: '/v1/refunds' });
    await sendRefunds(NOW);
    await deliverAll();
    expect(
      at.db
        .select()
        .from(refund)
        .all()
        .map(({ state }) => state),
    ).toEqual(['failed', 'owed']);
    expect(await sendRefunds(NOW + MINUTE)).toBe(0);
    expect(await sendRefunds(NOW + 61 * MINUTE)).toBe(1);
    expect(
      at.db
        .select()
        .from(refund)
        .all()
        .map(({ state }) => state),
    ).toEqual(['failed', 'succeeded']);
  });

  test('the provider down: tried again, ever more slowly, and never twice', async () => {
    await owed();
    await desk.control('faults', { kind: 'cut-after-success', count: 1, path: '/v1/refunds' });
    await sendRefunds(NOW);
    await sendRefunds(NOW + 10 * MINUTE);
    const refunds = (await desk.events()).filter(({ type }) => type === 'refund.created');
    expect(refunds).toHaveLength(1);
    expect(at.db.select().from(refund).all()).toMatchObject([{ state: 'succeeded' }]);
    await desk.control('reset');
    at.db.update(refund).set({ state: 'owed', attempts: 0, nextAttemptAt: NOW }).run();
    await sendRefunds(NOW);
    expect(at.db.select().from(refund).all()).toMatchObject([
      { state: 'owed', attempts: 1, nextAttemptAt: NOW + MINUTE },
    ]);
    at.db.update(refund).set({ state: 'succeeded' }).run();
  });
});

test('a session of ours that we never noted as open is noted when heard of', () => {
  buildFarCamp(at.db);
  const id = heldOrder(at.db, NOW);
  at.db
    .insert(payment)
    .values({
      id: 'pay_x',
      orderId: id,
      state: 'opening',
      amount: 46_000 as never,
      currency: 'EUR',
      createdAt: NOW,
      updatedAt: NOW,
    })
    .run();
  const session = {
    id: 'cs_x',
    state: 'open',
    amount: 46_000,
    currency: 'EUR',
    orderId: id,
    paymentId: 'pay_x',
    intentId: null,
    url: 'http://127.0.0.1/pay',
  } as const;
  at.db.transaction((tx) => applySession(tx, session, NOW), { behavior: 'immediate' });
  expect(at.db.select().from(payment).get()).toMatchObject({ state: 'open', sessionId: 'cs_x' });
});
