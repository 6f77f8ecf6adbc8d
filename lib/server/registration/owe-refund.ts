import 'server-only';
import { refund } from '@/db/schema/money';
import type { Id, OrderId } from '@/lib/domain/shared/ids';
import type { Minor } from '@/lib/domain/shared/money';
import type { Tx } from '../db';
import { newId } from '../new-id';

/** Writes down that money goes back; the background asks the provider for it until it has gone. */
export function oweRefund(
  tx: Tx,
  owed: {
    orderId: OrderId;
    paymentId: Id<'pay'>;
    amount: Minor;
    currency: string;
    reason: string;
    /** Epoch ms from which to ask. */
    from: number;
    now: number;
  },
): Id<'rfd'> {
  const { orderId, paymentId, amount, currency, reason, from, now } = owed;
  const id = newId('rfd', now);
  tx.insert(refund)
    .values({
      id,
      orderId,
      paymentId,
      amount,
      currency,
      reason,
      state: 'owed',
      nextAttemptAt: from,
      createdAt: now,
      updatedAt: now,
    })
    .run();
  return id;
}
