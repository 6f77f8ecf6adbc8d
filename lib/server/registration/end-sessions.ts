import 'server-only';
import { and, eq, inArray } from 'drizzle-orm';
import { payment } from '@/db/schema/money';
import type { OrderId } from '@/lib/domain/shared/ids';
import { getDb, inTransaction } from '../db';
import { expireSession } from '../payments/expire-session';
import { applySession } from './apply-session';
import { openPayment } from './open-payment';

/** Ends an order's sessions at the provider, or learns that one was paid. False while it does not answer. */
export async function endSessions(orderId: OrderId, now: number): Promise<boolean> {
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
