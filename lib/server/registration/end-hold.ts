import 'server-only';
import { and, eq } from 'drizzle-orm';
import { order } from '@/db/schema/order';
import type { OrderId } from '@/lib/domain/shared/ids';
import { getDb, inTransaction } from '../db';
import { endSessions } from './end-sessions';
import { lapseOrder } from './lapse-order';

/**
 * Ends a hold before its time, at the payer's wish: its time is set to now, then it goes the way of every hold whose
 * time is over. Money that arrived first wins.
 */
export async function endHold(
  orderId: OrderId,
  now: number,
): Promise<'expired' | 'paid' | 'payment_down' | 'not_payable'> {
  inTransaction((tx) =>
    tx
      .update(order)
      .set({ heldUntil: now, updatedAt: now })
      .where(and(eq(order.id, orderId), eq(order.state, 'held')))
      .run(),
  );
  if ((await endSessions(orderId, now)) === 'ended') inTransaction((tx) => lapseOrder(tx, orderId, now));
  const row = getDb().select({ state: order.state }).from(order).where(eq(order.id, orderId)).get();
  if (row?.state === 'expired') return 'expired';
  if (row?.state === 'confirmed') return 'paid';
  return row?.state === 'held' ? 'payment_down' : 'not_payable';
}
