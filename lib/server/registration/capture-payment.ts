import 'server-only';
import { eq } from 'drizzle-orm';
import { payment } from '@/db/schema/money';
import { order } from '@/db/schema/order';
import { minor } from '@/lib/domain/shared/money';
import type { Tx } from '../db';
import { enqueueMail } from '../mail/enqueue-mail';
import { issueReceipt } from '../orders/issue-receipt';
import { postLedger } from '../orders/post-ledger';
import { confirmOrder } from './confirm-order';
import { oweRefund } from './owe-refund';
import { seatAgain } from './seat-again';

/**
 * Money has arrived. It buys what is held; after the hold it buys the same places if they are left; otherwise all of
 * it goes back and the payer is told. Never silent, never kept without a place.
 */
export function capturePayment(
  tx: Tx,
  paid: typeof payment.$inferSelect,
  by: { sessionId: string; intentId: string | null },
  now: number,
): void {
  const row = tx.select().from(order).where(eq(order.id, paid.orderId)).get();
  if (!row) throw new Error(`Payment ${paid.id} has no order`);
  tx.update(payment)
    .set({ state: 'captured', sessionId: by.sessionId, intentId: by.intentId, url: null, updatedAt: now })
    .where(eq(payment.id, paid.id))
    .run();
  const of = {
    organisationId: row.organisationId,
    orderId: row.id,
    currency: paid.currency,
    now,
  };
  postLedger(tx, {
    ...of,
    memo: 'Paid by card',
    cause: paid.id,
    entries: [
      { account: 'provider', amount: paid.amount },
      { account: 'payers', amount: minor(-paid.amount) },
    ],
  });
  issueReceipt(tx, { ...of, paymentId: paid.id, amount: paid.amount });
  if (row.state === 'held') {
    confirmOrder(tx, row, 'confirm', now);
    return;
  }
  if (row.state === 'expired' && seatAgain(tx, row, now)) return;
  const reason = row.state === 'confirmed' ? 'Paid twice' : 'Paid after the place had gone';
  const refundId = oweRefund(tx, {
    orderId: row.id,
    paymentId: paid.id,
    amount: paid.amount,
    currency: paid.currency,
    reason,
    from: now,
    now,
  });
  enqueueMail(tx, {
    kind: 'late-payment',
    toName: row.payerName,
    toEmail: row.payerEmail,
    payload: { orderId: row.id, refundId, reason },
    now,
  });
}
