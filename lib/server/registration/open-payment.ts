import 'server-only';
import { and, asc, eq } from 'drizzle-orm';
import { camp } from '@/db/schema/camp';
import { payment } from '@/db/schema/money';
import { order, orderLine } from '@/db/schema/order';
import type { Id } from '@/lib/domain/shared/ids';
import { err, type Result } from '@/lib/domain/shared/result';
import { getDb, inTransaction } from '../db';
import { env } from '../env';
import { createSession } from '../payments/create-session';
import type { ProviderError } from '../payments/provider-error';
import type { ProviderSession } from '../payments/provider-session';
import { applySession } from './apply-session';

/**
 * Asks the provider for the session of a payment that has none noted yet, outside of any transaction, and notes it.
 * What is sent follows from stored rows alone, so asking again after a crash gets the same session.
 */
export async function openPayment(
  id: Id<'pay'>,
  now: number,
): Promise<Result<ProviderSession, ProviderError>> {
  const db = getDb();
  const row = db
    .select({ payment, order, slug: camp.slug })
    .from(payment)
    .innerJoin(order, eq(order.id, payment.orderId))
    .innerJoin(camp, eq(camp.id, order.campId))
    .where(eq(payment.id, id))
    .get();
  if (!row) return err('refused');
  const lines = db
    .select()
    .from(orderLine)
    .where(eq(orderLine.orderId, row.order.id))
    .orderBy(asc(orderLine.position))
    .all();
  const base = env().BASE_URL;
  const session = await createSession({
    paymentId: id,
    orderId: row.order.id,
    reference: row.order.reference,
    payerEmail: row.order.payerEmail,
    currency: row.payment.currency,
    lines,
    successUrl: `${base}/my/orders/${row.order.id}/paid`,
    cancelUrl: `${base}/camps/${row.slug}/register/pay?order=${row.order.id}&back=1`,
    createdAt: row.payment.createdAt,
  });
  if (session.ok) inTransaction((tx) => applySession(tx, session.value, now));
  else if (session.error === 'refused')
    // Understood and said no: there is no session, so the next press may begin a new payment.
    inTransaction((tx) =>
      tx
        .update(payment)
        .set({ state: 'expired', updatedAt: now })
        .where(and(eq(payment.id, id), eq(payment.state, 'opening')))
        .run(),
    );
  return session;
}
