import { afterAll, beforeEach, describe, expect, test } from 'vitest';
import { payment, paymentEvent, receipt } from '@/db/schema/money';
import { ticket } from '@/db/schema/order';
import type { OrderId } from '@/lib/domain/shared/ids';
import { checkBooks } from '@/lib/server/orders/check-books';
import { listSetAside } from '@/lib/server/orders/list-set-aside';
import { takeWebhook } from '@/lib/server/registration/take-webhook';
import {
  buildFarCamp,
  deliver,
  heldOrder,
  openDesk,
  pressPay,
  stateOf,
  type Told,
  type WebhookSlip,
} from '@/tests/builders/checkout-desk';
import { signWebhook } from '@/tests/fakes/stripe/sign-webhook';
import { useTestDatabase } from '@/tests/setup/test-database';

const at = useTestDatabase();
const desk = await openDesk();
const NOW = Date.now();
let id: OrderId;
let completed: Told;

beforeEach(async () => {
  buildFarCamp(at.db);
  id = heldOrder(at.db, NOW);
  await desk.play(await pressPay(at.db, id, NOW));
  const found = (await desk.events()).findLast(({ type }) => type === 'checkout.session.completed');
  if (!found) throw new Error('the stand-in sent no event');
  completed = found;
});
afterAll(() => desk.mock.close());

const seen = () => at.db.select().from(paymentEvent).all();

test('a right one is taken at once', async () => {
  expect(await deliver(completed, NOW)).toMatchObject({ status: 200, outcome: 'applied' });
  expect(stateOf(at.db, id)).toBe('confirmed');
});

// Assurance 2.12: tolerance 300 s both ways; the SDK alone lets any time in the future pass.
const SLIPS: [string, (body: string) => WebhookSlip][] = [
  ['signed with another secret', () => ({ secret: 'whsec_somebody_else' })],
  ['without a signature', () => ({ header: null })],
  ['with an empty signature', () => ({ header: '' })],
  ['with a signature of nothing', () => ({ header: `t=${Math.floor(NOW / 1000)},v1=` })],
  ['signed 301 seconds ago', () => ({ signedAt: NOW - 301_000 })],
  ['signed 302 seconds ahead', () => ({ signedAt: NOW + 302_000 })],
  ['with the body changed after signing', (body) => ({ body: body.replace('46000', '1') })],
  [
    'with a fresh time put before a stale one',
    (body) => ({ header: `t=${Math.floor(NOW / 1000)},${signWebhook(body, 'whsec_demo_combwood', 1)}` }),
  ],
];
test.each(SLIPS)('%s: refused with 400, and nothing is written', async (_what, slip) => {
  const answer = await deliver(completed, NOW, slip(JSON.stringify(completed, null, 2)));
  expect(answer.status).toBe(400);
  expect(seen()).toEqual([]);
  expect(stateOf(at.db, id)).toBe('held');
});

test('signed 299 seconds ago or ahead: taken', async () => {
  expect(await deliver(completed, NOW, { signedAt: NOW - 299_000 })).toMatchObject({ status: 200 });
  expect(await deliver({ ...completed, id: 'evt_2' }, NOW, { signedAt: NOW + 299_000 })).toMatchObject({
    status: 200,
  });
});

test('larger than any event: 413, by its length or by what comes', async () => {
  const huge = 'x'.repeat(300 * 1024);
  const post = (init: RequestInit) =>
    takeWebhook(new Request('http://localhost/api/stripe/webhook', { method: 'POST', ...init }), NOW);
  expect((await post({ body: huge })).status).toBe(413);
  const stream = new ReadableStream({
    pull: (controller) => controller.enqueue(new TextEncoder().encode('y'.repeat(64 * 1024))),
  });
  expect((await post({ body: stream, duplex: 'half' } as RequestInit)).status).toBe(413);
});

describe('kept for a person, with 200, and nothing moves', () => {
  const session = () => completed.data.object;
  const cases: [string, () => Record<string, unknown>, RegExp][] = [
    ['a wrong amount', () => ({ ...session(), amount_total: 45_999 }), /45999 EUR/],
    ['a wrong currency', () => ({ ...session(), currency: 'usd' }), /46000 USD/],
    [
      'another order named',
      () => ({ ...session(), metadata: { ...(session().metadata as object), orderId: 'ord_other' } }),
      /another order/,
    ],
    [
      'an unknown session and payment',
      () => ({
        ...session(),
        id: 'cs_unknown',
        metadata: { orderId: 'ord_unknown', paymentId: 'pay_unknown' },
      }),
      /No payment of ours/,
    ],
    [
      'a known payment in a session that is not its own',
      () => ({ ...session(), id: 'cs_stranger' }),
      /No payment of ours/,
    ],
    ['no names at all', () => ({ ...session(), id: 'cs_bare', metadata: null }), /No payment of ours/],
  ];
  test.each(cases)('%s', async (_what, object, reason) => {
    const answer = await deliver({ ...completed, data: { object: object() } }, NOW);
    expect(answer).toMatchObject({ status: 200, outcome: 'set-aside' });
    expect(listSetAside(at.db)).toMatchObject([{ reason: expect.stringMatching(reason) }]);
    expect(stateOf(at.db, id)).toBe('held');
    expect(at.db.select().from(payment).get()).toMatchObject({ state: 'open' });
    expect(checkBooks(at.db)).toEqual([]);
    // Sent again it is known, and the right one still counts.
    expect(await deliver({ ...completed, data: { object: object() } }, NOW)).toMatchObject({
      outcome: 'repeated',
    });
    expect(await deliver({ ...completed, id: 'evt_right' }, NOW)).toMatchObject({ outcome: 'applied' });
  });

  test('a refund that we did not ask for', async () => {
    const refund = {
      id: 're_desk',
      object: 'refund',
      status: 'succeeded',
      amount: 46_000,
      currency: 'eur',
      metadata: {},
    };
    const event = { ...completed, id: 'evt_r', type: 'refund.created', data: { object: refund } };
    expect(await deliver(event, NOW)).toMatchObject({ outcome: 'set-aside' });
  });
});

test('an event of a kind that nothing follows from is noted and answered', async () => {
  const event = { ...completed, id: 'evt_o', type: 'customer.created', data: { object: { id: 'cus_1' } } };
  expect(await deliver(event, NOW)).toMatchObject({ status: 200, outcome: 'ignored' });
  expect(seen()).toMatchObject([{ id: 'evt_o', outcome: 'ignored' }]);
});

test('the same news under another event id counts once', async () => {
  await deliver(completed, NOW);
  expect(await deliver({ ...completed, id: 'evt_copy' }, NOW)).toMatchObject({ outcome: 'ignored' });
  expect(at.db.select().from(receipt).all()).toHaveLength(1);
  expect(at.db.select().from(ticket).all()).toHaveLength(1);
});

test('a write that breaks half way leaves nothing, not even the event, and asks to be sent again', async () => {
  at.db.$client.exec("create trigger broken before insert on ticket begin select raise(abort, 'disk'); end");
  const answer = await deliver(completed, NOW);
  expect(answer.status).toBe(500);
  expect(answer.detail).not.toContain('disk');
  expect(seen()).toEqual([]);
  expect(stateOf(at.db, id)).toBe('held');
  expect(at.db.select().from(receipt).all()).toEqual([]);
  at.db.$client.exec('drop trigger broken');
  expect(await deliver(completed, NOW)).toMatchObject({ status: 200, outcome: 'applied' });
  expect(checkBooks(at.db)).toEqual([]);
});
