import 'server-only';
import { and, eq, inArray } from 'drizzle-orm';
import { payment } from '@/db/schema/money';
import type { OrderId } from '@/lib/domain/shared/ids';
import { getDb, inTransaction } from '../db';
import { expireSession } from '../payments/expire-session';
import type { ProviderError } from '../payments/provider-error';
import { applySession } from './apply-session';
import { openPayment } from './open-payment';

/**
 * Ends an order's sessions at the provider, or learns that one was paid. `unavailable` while it does not answer;
 * `refused` when it does not know a session that we noted: then only a person can tell whether money is on its way.
 */
export async function endSessions(orderId: OrderId, now: number): Promise<'ended' | ProviderError> {
  const live = getDb()
    .select()
    .from(payment)
    .where(and(eq(payment.orderId, orderId), inArray(payment.state, ['opening', 'open'])))
    .all();
  for (const row of live) {
    let { sessionId } = row;
    if (sessionId === null) {
      const opened = await openPayment(row.id, now);
      if (!opened.ok && opened.error === 'unavailable') return opened.error;
      sessionId = opened.ok ? opened.value.id : null;
    }
    if (sessionId === null) continue;
    const told = await expireSession(sessionId);
    if (!told.ok) return told.error;
    inTransaction((tx) => applySession(tx, told.value, now));
  }
  return 'ended';
}
