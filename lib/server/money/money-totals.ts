import 'server-only';
import { eq, sql } from 'drizzle-orm';
import { ledger } from '@/db/schema/money';
import { order } from '@/db/schema/order';
import type { MoneyTotals } from '@/lib/domain/money/camp-money';
import type { CampId } from '@/lib/domain/shared/ids';
import { minor } from '@/lib/domain/shared/money';
import { getDb } from '../db';
import { dueSql } from '../orders/due-sql';

/** A camp's money from its ledger, and what is due from its orders; two statements whatever the size. */
export function moneyTotals(campId: CampId): MoneyTotals {
  const db = getDb();
  const sumOf = (what: ReturnType<typeof sql>) => sql<number>`coalesce(sum(case when ${what} end), 0)`;
  const amount = sql`"ledger"."amount"`;
  const books = db
    .select({
      sold: sumOf(sql`"ledger"."account" = 'income' then -${amount}`),
      paid: sumOf(sql`"ledger"."account" = 'provider' and "ledger"."memo" not like 'Refund%' then ${amount}`),
      refunded: sumOf(
        sql`"ledger"."account" = 'provider' and "ledger"."memo" like 'Refund%' then -${amount}`,
      ),
    })
    .from(ledger)
    .innerJoin(order, eq(order.id, ledger.orderId))
    .where(eq(order.campId, campId))
    .get();
  // Each order's due once, in a subquery: written out in every sum, SQLite would work it out for each.
  const each = db
    .select({ due: dueSql.as('due') })
    .from(order)
    .where(eq(order.campId, campId))
    .as('each');
  const due = db
    .select({
      orders: sql<number>`count(*)`,
      owed: sql<number>`coalesce(sum(max(${each.due}, 0)), 0)`,
      owing: sql<number>`coalesce(sum(${each.due} > 0), 0)`,
      back: sql<number>`coalesce(sum(max(-${each.due}, 0)), 0)`,
      backing: sql<number>`coalesce(sum(${each.due} < 0), 0)`,
    })
    .from(each)
    .get();
  return {
    orders: due?.orders ?? 0,
    sold: minor(books?.sold ?? 0),
    paid: minor(books?.paid ?? 0),
    refunded: minor(books?.refunded ?? 0),
    owed: minor(due?.owed ?? 0),
    owing: due?.owing ?? 0,
    back: minor(due?.back ?? 0),
    backing: due?.backing ?? 0,
  };
}
