import 'server-only';
import { and, eq, sql } from 'drizzle-orm';
import { ledger } from '@/db/schema/money';
import { order } from '@/db/schema/order';
import type { OrderId } from '@/lib/domain/shared/ids';
import { type Minor, minor } from '@/lib/domain/shared/money';
import { type Db, getDb, type Tx } from '../db';

/**
 * What the payer still owes on an order, by the ledger; negative is what we owe back. An order that is not confirmed
 * has no sale in the books yet: all of it is due while held, nothing once it has ended.
 */
export function orderDue(orderId: OrderId, db: Db | Tx = getDb()): { amount: Minor; currency: string } {
  const row = db
    .select({
      state: order.state,
      total: order.total,
      currency: order.currency,
      owed: sql<number>`coalesce(sum(${ledger.amount}), 0)`,
    })
    .from(order)
    .leftJoin(ledger, and(eq(ledger.orderId, order.id), eq(ledger.account, 'payers')))
    .where(eq(order.id, orderId))
    .groupBy(order.id)
    .get();
  if (!row) throw new Error(`No order ${orderId}`);
  const waits = row.state === 'held' || row.state === 'offered';
  return { amount: waits ? row.total : minor(row.owed), currency: row.currency };
}
