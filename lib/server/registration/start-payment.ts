import 'server-only';
import { and, desc, eq, inArray } from 'drizzle-orm';
import { payment } from '@/db/schema/money';
import { order } from '@/db/schema/order';
import type { OrderId } from '@/lib/domain/shared/ids';
import { err, ok, type Result } from '@/lib/domain/shared/result';
import { getDb, inTransaction } from '../db';
import { newId } from '../new-id';
import { getSession } from '../payments/get-session';
import { applySession } from './apply-session';
import { openPayment } from './open-payment';

export type PayRefusal = 'hold_over' | 'not_payable' | 'payment_down';
/** Where the payer goes: the provider's page, or on, because it is paid already. */
export type PayStart = { go: 'provider'; url: string } | { go: 'paid' };

/**
 * Leads to the provider's page for a held order. An open session is used again, so that two tabs pay one payment; the
 * row is written before the provider is asked, so that a crash in between is picked up by its key.
 */
export async function startPayment(orderId: OrderId, now: number): Promise<Result<PayStart, PayRefusal>> {
  const ready = inTransaction((tx) => {
    const row = tx.select().from(order).where(eq(order.id, orderId)).get();
    if (row?.state === 'confirmed') return ok('paid' as const);
    if (row?.state === 'expired') return err('hold_over' as const);
    if (row?.state !== 'held' || row.heldUntil === null) return err('not_payable' as const);
    if (row.heldUntil <= now) return err('hold_over' as const);
    const live = tx
      .select()
      .from(payment)
      .where(and(eq(payment.orderId, orderId), inArray(payment.state, ['opening', 'open'])))
      .orderBy(desc(payment.createdAt))
      .get();
    if (live) return ok(live);
    const id = newId('pay', now);
    tx.insert(payment)
      .values({
        id,
        orderId,
        state: 'opening',
        amount: row.total,
        currency: row.currency,
        createdAt: now,
        updatedAt: now,
      })
      .run();
    const made = tx.select().from(payment).where(eq(payment.id, id)).get();
    return made ? ok(made) : err('not_payable' as const);
  });
  if (!ready.ok) return ready;
  if (ready.value === 'paid') return ok({ go: 'paid' });

  const live = ready.value;
  const session = live.sessionId ? await getSession(live.sessionId) : await openPayment(live.id, now);
  if (!session.ok) return err('payment_down');
  if (session.value.state === 'open' && session.value.url)
    return ok({ go: 'provider', url: session.value.url });
  // It moved on without us: take the news, then look at the order afresh.
  inTransaction((tx) => applySession(tx, session.value, now));
  const after = getDb().select({ state: order.state }).from(order).where(eq(order.id, orderId)).get();
  if (after?.state === 'confirmed' || session.value.state === 'waiting') return ok({ go: 'paid' });
  return session.value.state === 'expired' ? startPayment(orderId, now) : err('not_payable');
}
