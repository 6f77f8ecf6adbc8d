import 'server-only';
import type Stripe from 'stripe';

export type ProviderRefund = {
  id: string;
  state: 'pending' | 'succeeded' | 'failed';
  amount: number;
  currency: string;
  refundId: string;
};

export const toProviderRefund = (refund: Stripe.Refund): ProviderRefund => ({
  id: refund.id,
  state:
    refund.status === 'succeeded'
      ? 'succeeded'
      : refund.status === 'failed' || refund.status === 'canceled'
        ? 'failed'
        : 'pending',
  amount: refund.amount,
  currency: refund.currency.toUpperCase(),
  refundId: refund.metadata?.refundId ?? '',
});
