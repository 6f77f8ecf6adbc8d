import 'server-only';
import { eq } from 'drizzle-orm';
import { order } from '@/db/schema/order';
import type { OrderId } from '@/lib/domain/shared/ids';
import { type Minor, minor } from '@/lib/domain/shared/money';
import { type Db, getDb, type Tx } from '../db';
import { dueSql } from './due-sql';

/** What the payer still owes on an order (see `dueSql`). */
export function orderDue(orderId: OrderId, db: Db | Tx = getDb()): { amount: Minor; currency: string } {
  const row = db
    .select({ due: dueSql, currency: order.currency })
    .from(order)
    .where(eq(order.id, orderId))
    .get();
  if (!row) throw new Error(`No order ${orderId}`);
  return { amount: minor(row.due), currency: row.currency };
}
