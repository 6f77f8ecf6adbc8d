import 'server-only';
import { type SQL, sql } from 'drizzle-orm';
import { type Db, getDb } from '../db';

export type Violation = { rule: BookRule; ids: string; detail: string };

/**
 * What must hold of money and places whenever no transaction is running. Each query lists what breaks its rule; the
 * numbers are those of the invariants that the tests name.
 */
const RULES = {
  'posting balances': sql`
    select posting as ids, 'sums to ' || sum(amount) as detail from ledger group by posting having sum(amount) <> 0`,
  'posting has one order and currency': sql`
    select posting as ids, 'mixed' as detail from ledger group by posting
    having count(distinct order_id) > 1 or count(distinct currency) > 1`,
  'ledger equals captured less refunded': sql`
    with booked as (
      select order_id, currency, sum(amount) as amount from ledger where account = 'provider' group by order_id, currency),
    moved as (
      select order_id, currency, sum(amount) as amount from (
        select order_id, currency, amount from payment where state = 'captured'
        union all select order_id, currency, -amount from refund where state = 'succeeded')
      group by order_id, currency)
    select coalesce(booked.order_id, moved.order_id) as ids,
      'ledger ' || coalesce(booked.amount, 0) || ', moved ' || coalesce(moved.amount, 0) as detail
    from booked full join moved on moved.order_id = booked.order_id and moved.currency = booked.currency
    where coalesce(booked.amount, 0) <> coalesce(moved.amount, 0)`,
  'a confirmed order is sold for its total': sql`
    select o.id as ids, 'total ' || o.total || ', sold ' || coalesce(-sum(l.amount), 0) as detail
    from "order" o left join ledger l on l.order_id = o.id and l.account = 'income'
    where o.state = 'confirmed' group by o.id having coalesce(-sum(l.amount), 0) <> o.total`,
  'a confirmed order is paid, less what goes back': sql`
    select o.id as ids, 'total ' || o.total || ', kept ' || paid.amount as detail
    from "order" o join (
      select o2.id, coalesce((select sum(p.amount) from payment p where p.order_id = o2.id and p.state = 'captured'), 0)
        - coalesce((select sum(r.amount) from refund r where r.order_id = o2.id and r.state <> 'failed'), 0) as amount
      from "order" o2) paid on paid.id = o.id
    where o.state = 'confirmed' and paid.amount <> o.total`,
  'money without a place goes back': sql`
    select o.id as ids, o.state || ', kept ' || kept as detail from (
      select o2.id, o2.state, coalesce((select sum(p.amount) from payment p where p.order_id = o2.id and p.state = 'captured'), 0)
        - coalesce((select sum(r.amount) from refund r where r.order_id = o2.id and r.state <> 'failed'), 0) as kept
      from "order" o2 where o2.state in ('held', 'expired')) o
    where kept <> 0`,
  'refunds are no more than was captured': sql`
    select p.id as ids, 'captured ' || p.amount || ', refunds ' || sum(r.amount) as detail
    from payment p join refund r on r.payment_id = p.id and r.state <> 'failed'
    group by p.id having sum(r.amount) > case when p.state = 'captured' then p.amount else 0 end`,
  'order total is the sum of its lines': sql`
    select o.id as ids, 'total ' || o.total || ', lines ' || coalesce(sum(l.amount), 0) as detail
    from "order" o left join order_line l on l.order_id = o.id
    group by o.id having coalesce(sum(l.amount), 0) <> o.total
    union all select id, 'quantity × unit is not the amount' from order_line where quantity * unit <> amount`,
  'payment is over its order’s total': sql`
    select p.id as ids, p.amount || ' ' || p.currency || ', order ' || o.total || ' ' || o.currency as detail
    from payment p join "order" o on o.id = p.order_id where p.amount <> o.total or p.currency <> o.currency`,
  'camp is not oversold': sql`
    select c.id as ids, count(*) || ' seated of ' || c.capacity as detail
    from camp c join registration r on r.camp_id = c.id and r.state in ('held', 'confirmed', 'offered')
    group by c.id having count(*) > c.capacity`,
  'track is not oversold': sql`
    select t.id as ids, count(*) || ' seated of ' || t.capacity as detail
    from track t join registration r on r.track_id = t.id and r.state in ('held', 'confirmed', 'offered')
    group by t.id having count(*) > t.capacity`,
  'elective is not oversold': sql`
    select w.id as ids, count(*) || ' seated of ' || w.capacity as detail
    from workshop w join registration_workshop s on s.workshop_id = w.id
    join registration r on r.id = s.registration_id and r.state in ('held', 'confirmed', 'offered')
    where w.capacity is not null group by w.id having count(*) > w.capacity`,
  'confirmed has exactly one valid ticket, others none': sql`
    select r.id as ids, r.state || ' with ' || count(t.id) as detail
    from registration r left join ticket t on t.registration_id = r.id and t.revoked_at is null
    group by r.id having count(t.id) <> (r.state = 'confirmed')`,
  'ticket is for the registration’s own camp': sql`
    select t.id as ids, t.camp_id || ', not ' || r.camp_id as detail
    from ticket t join registration r on r.id = t.registration_id where r.camp_id <> t.camp_id`,
  'held and unpaid order has registrations in the same state': sql`
    select r.id as ids, r.state || ' in an order that is ' || o.state as detail
    from registration r join "order" o on o.id = r.order_id
    where (o.state in ('held', 'expired', 'confirmed') or r.state in ('held', 'expired'))
      and r.state <> o.state and not (o.state = 'confirmed' and r.state in ('cancelled', 'transferred'))`,
  'a held order says until when': sql`
    select id as ids, 'held without an end' as detail from "order" where state = 'held' and held_until is null`,
  'receipts are numbered without gaps': sql`
    select organisation_id as ids, count(*) || ' receipts, from ' || min(number) || ' to ' || max(number) as detail
    from receipt group by organisation_id
    having min(number) <> 1 or max(number) <> count(*) or count(distinct number) <> count(*)`,
  'every captured payment has its receipt': sql`
    select p.id as ids, 'captured ' || p.amount || ', receipt ' || coalesce(r.amount, 'none') as detail
    from payment p left join receipt r on r.payment_id = p.id
    where p.state = 'captured' and (r.id is null or r.amount <> p.amount or r.currency <> p.currency)
    union all select r.id, 'of a payment that is ' || p.state from receipt r
    join payment p on p.id = r.payment_id where p.state <> 'captured'`,
  'the ledger and events are kept from change': sql`
    select name as ids, 'trigger is missing' as detail from (
      select 'ledger_no_update' as name union select 'ledger_no_delete' union select 'payment_event_no_delete')
    where name not in (select name from sqlite_master where type = 'trigger')`,
} as const satisfies Record<string, SQL>;

export type BookRule = keyof typeof RULES;
export const BOOK_RULES = Object.keys(RULES) as BookRule[];

/** Everything that does not hold, in the order of the rules; empty when the books are right. */
export function checkBooks(db: Db = getDb()): Violation[] {
  return BOOK_RULES.flatMap((rule) =>
    db.all<{ ids: string; detail: string }>(RULES[rule]).map((found) => ({ rule, ...found })),
  );
}
