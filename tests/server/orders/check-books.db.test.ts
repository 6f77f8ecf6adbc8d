import { spawnSync } from 'node:child_process';
import { afterAll, beforeEach, describe, expect, test } from 'vitest';
import { payment } from '@/db/schema/money';
import { BOOK_RULES, type BookRule, checkBooks } from '@/lib/server/orders/check-books';
import { sendRefunds } from '@/lib/server/registration/send-refunds';
import { buildFarCamp, deliver, heldOrder, openDesk, pressPay } from '@/tests/builders/checkout-desk';
import { useTestDatabase } from '@/tests/setup/test-database';

const at = useTestDatabase();
const desk = await openDesk();
afterAll(() => desk.mock.close());
const NOW = Date.now();
const run = (sql: string) => at.db.$client.exec(sql);

// One order confirmed (paid twice, the second payment refunded), one held, with everything that follows from them.
beforeEach(async () => {
  buildFarCamp(at.db);
  const paid = heldOrder(at.db, NOW, 'paid');
  const first = await pressPay(at.db, paid, NOW);
  at.db.update(payment).set({ state: 'expired' }).run();
  await desk.play(first);
  await desk.play(await pressPay(at.db, paid, NOW + 1));
  for (const event of await desk.events()) await deliver(event, NOW);
  await sendRefunds(NOW);
  heldOrder(at.db, NOW, 'held');
  await desk.control('reset');
});

const OPEN_LEDGER = 'drop trigger ledger_no_update; drop trigger ledger_no_delete;';
const CLOSE_LEDGER = `
  create trigger ledger_no_update before update on ledger begin select raise(abort, 'no'); end;
  create trigger ledger_no_delete before delete on ledger begin select raise(abort, 'no'); end;`;
const HELD = '(select id from "order" where state = \'held\')';
const CONFIRMED = '(select id from "order" where state = \'confirmed\')';

/** For each rule, what a bug would have to write to break it. */
const PLANTS: Record<BookRule, string> = {
  'posting balances': `${OPEN_LEDGER} update ledger set amount = amount + 1 where account = 'income'; ${CLOSE_LEDGER}`,
  'posting has one order and currency': `${OPEN_LEDGER} update ledger set currency = 'USD' where account = 'income'; ${CLOSE_LEDGER}`,
  'ledger equals captured less refunded': "update refund set state = 'pending'",
  'a confirmed order is sold for its total': `${OPEN_LEDGER} delete from ledger where memo = 'Place sold'; ${CLOSE_LEDGER}`,
  'a confirmed order is paid, less what goes back': 'delete from refund',
  'money without a place goes back': `update payment set order_id = ${HELD} where id = (select max(id) from payment)`,
  'refunds are no more than was captured': 'update refund set amount = 92001',
  'order total is the sum of its lines': 'update order_line set unit = 1, amount = 1',
  'payment is over its order’s total': "update payment set currency = 'USD'",
  'camp is not oversold': 'update camp set capacity = 1',
  'track is not oversold': 'update track set capacity = 1',
  'elective is not oversold': `
    insert into workshop (id, camp_id, title, kind, audience, length_minutes, capacity)
      values ('wsh_p', 'cmp_1', 'Reed repair', 'repair-bench', 'elective', 60, 1);
    insert into registration_workshop select id, 'wsh_p' from registration`,
  'confirmed has exactly one valid ticket, others none': 'update ticket set revoked_at = 1',
  'ticket is for the registration’s own camp': `
    insert into camp (id, organisation_id, slug, name, starts_on, ends_on, time_zone, currency, capacity, created_at, updated_at)
      values ('cmp_2', 'org_1', 'other', 'Other', '2099-01-01', '2099-01-02', 'UTC', 'EUR', 1, 1, 1);
    update ticket set camp_id = 'cmp_2'`,
  'held and unpaid order has registrations in the same state': `update registration set state = 'expired' where order_id = ${HELD}`,
  'a held order says until when': `update "order" set held_until = null where id = ${HELD}`,
  'receipts are numbered without gaps': 'update receipt set number = 3 where number = 2',
  'every captured payment has its receipt': 'delete from receipt where number = 2',
  'the ledger and events are kept from change': 'drop trigger payment_event_no_delete',
};

test('books made by the real use-cases hold', () => {
  expect(checkBooks()).toEqual([]);
});

describe('each rule finds its own break', () => {
  test.each(BOOK_RULES)('%s', (rule) => {
    run(PLANTS[rule]);
    const found = checkBooks();
    expect(found.map((violation) => violation.rule)).toContain(rule);
    for (const { ids, detail } of found)
      expect([ids, detail].every((text) => String(text).length > 0)).toBe(true);
  });
});

test('what was written stays: the database itself refuses to change ledger and events', () => {
  expect(() => run('update ledger set amount = 0')).toThrow(/append-only/);
  expect(() => run('delete from ledger')).toThrow(/append-only/);
  expect(() => run('delete from payment_event')).toThrow(/kept/);
});

test('a provider’s event id is in the books once', () => {
  const [event] = at.db.$client.prepare('select * from payment_event limit 1').all() as { id: string }[];
  expect(() =>
    at.db.$client
      .prepare(
        "insert into payment_event (id, type, object_id, outcome, received_at) values (?, 't', 'o', 'ignored', 1)",
      )
      .run(event?.id),
  ).toThrow(/UNIQUE/);
});

test('the command ends with 0 when they hold, and with 1, the first break and its ids when they do not', () => {
  const command = () =>
    spawnSync(process.execPath, ['--import', 'tsx', 'lib/server/orders/check-books-command.ts'], {
      env: { ...process.env, COMBWOOD_DB: at.file, TSX_TSCONFIG_PATH: 'tests/setup/tsconfig.json' },
      encoding: 'utf8',
    });
  const right = command();
  expect([right.status, right.stdout]).toEqual([0, `The books hold: ${BOOK_RULES.length} rules.\n`]);
  run(`update "order" set held_until = null where id = ${CONFIRMED} or id = ${HELD}`);
  const wrong = command();
  expect(wrong.status).toBe(1);
  expect(wrong.stderr).toMatch(/a held order says until when: ord_\w+ /);
});
