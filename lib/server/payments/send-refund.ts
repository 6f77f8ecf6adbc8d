import 'server-only';
import { ok, type Result } from '@/lib/domain/shared/result';
import { type ProviderError, toProviderError } from './provider-error';
import { type ProviderRefund, toProviderRefund } from './provider-refund';
import { stripeClient } from './stripe-client';

/** Gives money back. The refund row's id is the idempotency key: asked twice, the money goes once. */
export async function sendRefund(ask: {
  refundId: string;
  orderId: string;
  intentId: string;
  amount: number;
}): Promise<Result<ProviderRefund, ProviderError>> {
  try {
    const refund = await stripeClient().refunds.create(
      {
        payment_intent: ask.intentId,
        amount: ask.amount,
        metadata: { refundId: ask.refundId, orderId: ask.orderId },
      },
      { idempotencyKey: ask.refundId },
    );
    return ok(toProviderRefund(refund));
  } catch (error) {
    return toProviderError(error, 'refund.create');
  }
}
