import { beforeEach, expect, test } from 'vitest';
import { payment, paymentEvent, refund } from '@/db/schema/money';
import type { OrderId } from '@/lib/domain/shared/ids';
import { minor } from '@/lib/domain/shared/money';
import { inTransaction } from '@/lib/server/db';
import { listLedger } from '@/lib/server/money/list-ledger';
import { listOrders } from '@/lib/server/money/list-orders';
import { moneyQuestions } from '@/lib/server/money/money-questions';
import { moneyTotals } from '@/lib/server/money/money-totals';
import { postLedger } from '@/lib/server/orders/post-ledger';
import { buildCamp, NOW } from '../../builders/build-camp';
import { buildCrowd } from '../../builders/build-crowd';
import { buildOrder } from '../../builders/build-order';
import { recordStatements } from '../../setup/record-statements';
import { useTestDatabase } from '../../setup/test-database';

const at = useTestDatabase();
beforeEach(() => {
  buildCamp(at.db);
  buildCamp(at.db, { id: 'cmp_2', organisationId: 'org_2' });
});

const PRICE = 46_000;
type Memo = Parameters<typeof postLedger>[1]['memo'];
const post = (
  orderId: OrderId,
  memo: Memo,
  provider: number,
  payers: number,
  income = 0,
  cause: string = orderId,
) =>
  inTransaction((tx) =>
    postLedger(tx, {
      organisationId: 'org_1',
      orderId,
      currency: 'EUR',
      memo,
      cause,
      now: NOW,
      entries: [
        { account: 'provider' as const, amount: minor(provider) },
        { account: 'payers' as const, amount: minor(payers) },
        { account: 'income' as const, amount: minor(income) },
      ].filter(({ amount }) => amount !== 0),
    }),
  );

/** One paid, one sold and unpaid, one held, one paid and cancelled with half given back of what it was owed. */
function books() {
  buildOrder(at.db, { id: 'ord_1' });
  post('ord_1', 'Place sold', 0, PRICE, -PRICE);
  post('ord_1', 'Paid by card', PRICE, -PRICE);
  buildOrder(at.db, { id: 'ord_2' });
  post('ord_2', 'Place sold', 0, PRICE, -PRICE);
  buildOrder(at.db, { id: 'ord_3', state: 'held' });
  buildOrder(at.db, { id: 'ord_4', state: 'expired' });
  post('ord_4', 'Paid by card', PRICE, -PRICE);
  post('ord_4', 'Refund', -PRICE / 2, PRICE / 2);
  buildOrder(at.db, { id: 'ord_5', state: 'expired' });
}

test('totals come from the ledger, and what is due from each order', () => {
  books();
  expect(moneyTotals('cmp_1')).toEqual({
    orders: 5,
    sold: 2 * PRICE,
    paid: 2 * PRICE,
    refunded: PRICE / 2,
    owed: 2 * PRICE,
    owing: 2,
    back: PRICE / 2,
    backing: 1,
  });
  expect(moneyTotals('cmp_2')).toMatchObject({ orders: 0, sold: 0, owed: 0 });
});

test('a refund that the bank sent back counts as not given back', () => {
  books();
  post('ord_4', 'Refund came back', PRICE / 2, -PRICE / 2);
  expect(moneyTotals('cmp_1')).toMatchObject({ paid: 2 * PRICE, refunded: 0, back: PRICE });
});

test('orders with what is paid and due, by filter; none of another camp', () => {
  books();
  const due = (show: 'all' | 'owes' | 'back') =>
    listOrders('cmp_1', show, 1)
      .orders.map((order) => [order.id, order.paid, order.due])
      .sort();
  expect(due('all')).toHaveLength(5);
  expect(due('owes')).toEqual([
    ['ord_2', 0, PRICE],
    ['ord_3', 0, PRICE],
  ]);
  expect(due('back')).toEqual([['ord_4', PRICE / 2, -PRICE / 2]]);
  expect(listOrders('cmp_2', 'all', 1)).toMatchObject({ orders: [], total: 0, pages: 1 });
});

test('the ledger keeps the lines of a posting together, and they sum to nothing', () => {
  books();
  const sums = new Map<string, number>();
  for (const { posting, amount } of listLedger('cmp_1')) sums.set(posting, (sums.get(posting) ?? 0) + amount);
  expect(sums.size).toBe(5);
  expect([...sums.values()].every((sum) => sum === 0)).toBe(true);
  expect(listLedger('cmp_2')).toEqual([]);
});

test('what was set aside and what failed waits for a person of the camp it is of', () => {
  books();
  const pay = { amount: minor(PRICE), currency: 'EUR', createdAt: NOW, updatedAt: NOW };
  at.db
    .insert(payment)
    .values({ id: 'pay_1', orderId: 'ord_4', state: 'captured', ...pay })
    .run();
  const back = {
    orderId: 'ord_4',
    paymentId: 'pay_1',
    reason: 'Paid after the place had gone',
    nextAttemptAt: NOW,
    ...pay,
  } as const;
  at.db
    .insert(refund)
    .values([
      { id: 'rfd_1', state: 'failed', ...back },
      { id: 'rfd_2', state: 'owed', ...back },
    ])
    .run();
  const event = { type: 'checkout.session.completed', objectId: 'cs_1', receivedAt: NOW } as const;
  at.db
    .insert(paymentEvent)
    .values([
      { id: 'evt_wrong', orderId: 'ord_1', outcome: 'set-aside', reason: 'The amount differs.', ...event },
      { id: 'evt_stray', orderId: null, outcome: 'set-aside', reason: 'We know no such order.', ...event },
      { id: 'evt_fine', orderId: 'ord_1', outcome: 'applied', ...event },
    ])
    .run();
  expect(
    moneyQuestions('cmp_1')
      .map(({ id }) => id)
      .sort(),
  ).toEqual(['evt_stray', 'evt_wrong', 'rfd_1']);
  expect(moneyQuestions('cmp_2').map(({ id }) => id)).toEqual(['evt_stray']);
});

test('as many statements for 2,000 orders as for one', () => {
  buildOrder(at.db);
  const page = (): number => {
    const seen = recordStatements(at.db);
    moneyTotals('cmp_1');
    moneyQuestions('cmp_1');
    listOrders('cmp_1', 'owes', 1);
    listLedger('cmp_1');
    seen.stop();
    return seen.executed.length;
  };
  const few = page();
  expect(few).toBeGreaterThan(0);
  buildCrowd(at.db, 2000, { trackIds: ['trk_1a'] });
  expect(page()).toBe(few);
});
