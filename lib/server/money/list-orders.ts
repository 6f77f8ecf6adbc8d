import 'server-only';
import { and, asc, count, desc, eq, sql } from 'drizzle-orm';
import { order } from '@/db/schema/order';
import type { MoneyOrder } from '@/lib/domain/money/camp-money';
import type { CampId } from '@/lib/domain/shared/ids';
import { minor } from '@/lib/domain/shared/money';
import { getDb } from '../db';
import { dueSql, paidSql } from '../orders/due-sql';

export const ORDERS_PAGE = 50;
export const ORDER_FILTERS = ['all', 'owes', 'back'] as const;
export type OrderFilter = (typeof ORDER_FILTERS)[number];

/** One page of a camp's orders, newest first, in two statements. A page past the end is the last one. */
export function listOrders(campId: CampId, show: OrderFilter, wanted: number) {
  const db = getDb();
  const where = and(
    eq(order.campId, campId),
    show === 'owes' ? sql`${dueSql} > 0` : show === 'back' ? sql`${dueSql} < 0` : undefined,
  );
  const total = db.select({ n: count() }).from(order).where(where).get()?.n ?? 0;
  const pages = Math.max(1, Math.ceil(total / ORDERS_PAGE));
  const page = Math.min(Math.max(1, wanted), pages);
  const rows = db
    .select({
      id: order.id,
      reference: order.reference,
      payer: order.payerName,
      state: order.state,
      total: order.total,
      paid: paidSql,
      due: dueSql,
      currency: order.currency,
      createdAt: order.createdAt,
    })
    .from(order)
    .where(where)
    .orderBy(desc(order.createdAt), asc(order.id))
    .limit(ORDERS_PAGE)
    .offset((page - 1) * ORDERS_PAGE)
    .all();
  const orders: MoneyOrder[] = rows.map((row) => ({ ...row, paid: minor(row.paid), due: minor(row.due) }));
  return { orders, total, page, pages };
}
