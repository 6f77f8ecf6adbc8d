import 'server-only';
import { and, asc, eq, inArray, lte } from 'drizzle-orm';
import { payment } from '@/db/schema/money';
import { order } from '@/db/schema/order';
import type { OrderId } from '@/lib/domain/shared/ids';
import { getDb, inTransaction } from '../db';
import { expireSession } from '../payments/expire-session';
import { applySession } from './apply-session';
import { lapseOrder } from './lapse-order';
import { openPayment } from './open-payment';

const AT_ONCE = 200;

/**
 * Ends holds whose time is over: first each session at the provider, whose "no" means that the payment won, then the
 * hold itself. While the provider does not answer, the places stay taken.
 */
export async function sweepHolds(now: number): Promise<number> {
  const due = getDb()
    .select({ id: order.id })
    .from(order)
    .where(and(eq(order.state, 'held'), lte(order.heldUntil, now)))
    .orderBy(asc(order.heldUntil))
    .limit(AT_ONCE)
    .all();
  let ended = 0;
  for (const { id } of due) {
    // Without an answer there will be none for the next one either; the coming round tries again.
    if (!(await endSessions(id, now))) break;
    if (inTransaction((tx) => lapseOrder(tx, id, now))) ended += 1;
  }
  return ended;
}

/** True when the provider has answered for every session of the order. */
async function endSessions(orderId: OrderId, now: number): Promise<boolean> {
  const live = getDb()
    .select()
    .from(payment)
    .where(and(eq(payment.orderId, orderId), inArray(payment.state, ['opening', 'open'])))
    .all();
  for (const row of live) {
    let { sessionId } = row;
    if (sessionId === null) {
      const opened = await openPayment(row.id, now);
      if (!opened.ok && opened.error === 'unavailable') return false;
      sessionId = opened.ok ? opened.value.id : null;
    }
    if (sessionId === null) continue;
    const told = await expireSession(sessionId);
    if (!told.ok) return false;
    inTransaction((tx) => applySession(tx, told.value, now));
  }
  return true;
}
