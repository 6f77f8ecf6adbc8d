import { copyFileSync } from 'node:fs';
import fc from 'fast-check';
import { afterAll, expect, test } from 'vitest';
import { type Db, openDatabase } from '@/db/client';
import { mail } from '@/db/schema/mail';
import { ledger, payment, receipt, refund } from '@/db/schema/money';
import { order, registration, ticket } from '@/db/schema/order';
import type { OrderId } from '@/lib/domain/shared/ids';
import { checkBooks } from '@/lib/server/orders/check-books';
import { reconcileOrder } from '@/lib/server/registration/reconcile-payments';
import { sendRefunds } from '@/lib/server/registration/send-refunds';
import {
  buildFarCamp,
  deliver,
  heldOrder,
  openDesk,
  pressPay,
  type Told,
} from '@/tests/builders/checkout-desk';
import { useTestDatabase } from '@/tests/setup/test-database';

const at = useTestDatabase();
const desk = await openDesk();
afterAll(() => desk.mock.close());
const held = globalThis as typeof globalThis & { combwoodDb?: Db };

/** What an order's story comes down to, without the ids and times that differ from telling to telling. */
function ending(db: Db) {
  const count = (rows: { kind: string }[]) => rows.map(({ kind }) => kind).sort();
  return {
    orders: db.select({ state: order.state, heldUntil: order.heldUntil }).from(order).all(),
    people: db.select({ state: registration.state }).from(registration).all(),
    tickets: db.select().from(ticket).all().length,
    payments: db
      .select({ state: payment.state })
      .from(payment)
      .all()
      .map(({ state }) => state),
    receipts: db.select({ number: receipt.number, amount: receipt.amount }).from(receipt).all(),
    refunds: db.select({ state: refund.state, amount: refund.amount }).from(refund).all(),
    ledger: db
      .select()
      .from(ledger)
      .all()
      .map(({ account, amount, memo }) => `${memo} ${account} ${amount}`)
      .sort(),
    mails: count(db.select({ kind: mail.kind }).from(mail).all()),
  };
}

/** Events by number in any order, all at least once, with repetitions; -1 asks the provider as the return page does. */
const story = (events: number) =>
  fc
    .tuple(
      fc.array(fc.integer({ min: -1, max: events - 1 }), { maxLength: 20 }),
      fc.shuffledSubarray([...Array(events).keys()], { minLength: events }),
    )
    .map(([noise, all]) => [...noise, ...all]);

let turn = 0;
/** Tells the same events in many orders, each to a copy of the database as it is now; all must end as `expected`. */
async function tell(id: OrderId, now: number, events: Told[], check: (db: Db) => void) {
  at.db.$client.pragma('wal_checkpoint(TRUNCATE)');
  const before = `${at.file}.before${turn}`;
  copyFileSync(at.file, before);
  const original = held.combwoodDb;
  try {
    await fc.assert(
      fc.asyncProperty(story(events.length), async (numbers) => {
        turn += 1;
        const file = `${at.file}.${turn}`;
        copyFileSync(before, file);
        const copy = openDatabase(file);
        held.combwoodDb = copy;
        try {
          for (const number of numbers) {
            const event = events[number];
            if (event) expect((await deliver(event, now)).status).toBe(200);
            else await reconcileOrder(id, now + 5_000);
          }
          expect(checkBooks(copy)).toEqual([]);
          check(copy);
        } finally {
          copy.$client.close();
        }
      }),
      { numRuns: 40 },
    );
  } finally {
    held.combwoodDb = original;
  }
}

/** An order with two sessions open at the provider, both of which will be paid: the busiest story there is. */
async function twiceOpen(now: number) {
  buildFarCamp(at.db);
  const id = heldOrder(at.db, now);
  const first = await pressPay(at.db, id, now);
  at.db.update(payment).set({ state: 'expired' }).run();
  const second = await pressPay(at.db, id, now + 1);
  return { id, first, second };
}

// Assurance 2.5: any permutation or repetition of an order's events ends in the same state.
test('payments in any order, any number of times, with asking in between, end alike', async () => {
  const now = Date.now();
  const { id, first, second } = await twiceOpen(now);
  await desk.play(first, 'decline');
  await desk.play(first);
  await desk.play(second);
  const events = await desk.events();
  expect(events.length).toBeGreaterThan(8);
  await tell(id, now, events, (db) =>
    expect(ending(db)).toEqual({
      orders: [{ state: 'confirmed', heldUntil: null }],
      people: [{ state: 'confirmed' }],
      tickets: 1,
      payments: ['captured', 'captured'],
      receipts: [
        { number: 1, amount: 46_000 },
        { number: 2, amount: 46_000 },
      ],
      refunds: [{ state: 'owed', amount: 46_000 }],
      ledger: [
        'Paid by card payers -46000',
        'Paid by card payers -46000',
        'Paid by card provider 46000',
        'Paid by card provider 46000',
        'Place sold income -46000',
        'Place sold payers 46000',
      ],
      mails: ['late-payment', 'order-confirmed', 'packing-list'],
    }),
  );
}, 120_000);

test.each([
  ['a refund that succeeds', undefined, ['succeeded'], 2],
  ['a refund that fails at the bank', 'refund-fails', ['failed', 'owed'], 0],
])(
  '%s: its events in any order, any number of times, end alike',
  async (_what, fault, states, booked) => {
    await desk.control('reset');
    const now = Date.now();
    const { id, first, second } = await twiceOpen(now);
    await desk.play(first);
    await desk.play(second);
    for (const event of await desk.events()) await deliver(event, now);
    const [owed] = at.db.select().from(refund).all();
    if (fault) await desk.control('faults', { kind: fault, path: '/v1/refunds' });
    // The provider did as it was asked, and its answer was lost on the way.
    await sendRefunds(now);
    const events = await desk.events();
    at.db.$client.exec('drop trigger ledger_no_delete');
    at.db.$client.exec("delete from ledger where memo in ('Refund', 'Refund came back')");
    migrateTrigger();
    at.db.delete(refund).run();
    at.db
      .insert(refund)
      .values(owed as never)
      .run();
    await tell(id, now, events, (db) => {
      expect(
        db
          .select()
          .from(refund)
          .all()
          .map(({ state }) => state),
      ).toEqual(states);
      const memos = db
        .select()
        .from(ledger)
        .all()
        .map(({ memo }) => memo);
      // A failure that was told first leaves a success that came before it untold: no money moved either way.
      expect(
        memos.filter((memo) => memo === 'Refund').length -
          memos.filter((memo) => memo === 'Refund came back').length,
      ).toBe(booked);
    });
  },
  120_000,
);

const migrateTrigger = () =>
  at.db.$client.exec(
    "create trigger ledger_no_delete before delete on ledger begin select raise(abort, 'the ledger is append-only'); end",
  );
