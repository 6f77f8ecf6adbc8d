import type { Stripe } from 'stripe';
import { newId } from './new-id';

// An invented share, there so that net and gross differ; what a real account pays is in its own contract.
const FEE = 0.029;

export function buildBalance(
  source: Stripe.Charge | Stripe.Refund,
  created: number,
  type: 'charge' | 'refund' | 'refund_failure',
): Stripe.BalanceTransaction {
  const amount = type === 'refund' ? -source.amount : source.amount;
  const fee = type === 'charge' ? Math.round(source.amount * FEE) : 0;
  const detail = {
    amount: fee,
    application: null,
    currency: source.currency,
    description: 'Processing fee of the stand-in',
    type: 'stripe_fee',
  };
  return {
    id: newId('txn_'),
    object: 'balance_transaction',
    amount,
    available_on: created + 2 * 24 * 60 * 60,
    balance_type: 'payments',
    created,
    currency: source.currency,
    description: source.description ?? null,
    exchange_rate: null,
    fee,
    fee_details: fee === 0 ? [] : [detail],
    net: amount - fee,
    reporting_category: type,
    source: source.id,
    status: 'pending',
    type,
  } satisfies Stripe.BalanceTransaction;
}
