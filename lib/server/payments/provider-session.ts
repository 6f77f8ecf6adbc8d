import 'server-only';
import type Stripe from 'stripe';

/** A Checkout Session cut down to what decides. */
export type ProviderSession = {
  id: string;
  /** waiting: the form is through, the money not yet (slow payment methods). */
  state: 'open' | 'waiting' | 'paid' | 'expired';
  amount: number | null;
  /** ISO 4217 in capitals, as our tables have it. */
  currency: string | null;
  orderId: string;
  paymentId: string;
  intentId: string | null;
  url: string | null;
};

const OVER: readonly string[] = ['requires_payment_method', 'canceled'];

export function toProviderSession(session: Stripe.Checkout.Session): ProviderSession {
  const { payment_intent: intent } = session;
  return {
    id: session.id,
    state: sessionState(session),
    amount: session.amount_total,
    currency: session.currency?.toUpperCase() ?? null,
    orderId: session.metadata?.orderId ?? '',
    paymentId: session.metadata?.paymentId ?? '',
    intentId: typeof intent === 'string' ? intent : (intent?.id ?? null),
    url: session.url,
  };
}

function sessionState(session: Stripe.Checkout.Session): ProviderSession['state'] {
  const { status, payment_status: paid, payment_intent: intent } = session;
  if (status === 'expired') return 'expired';
  if (status !== 'complete') return 'open';
  if (paid !== 'unpaid') return 'paid';
  // A slow method that failed leaves the session complete for good; only its intent, where it was asked for, tells.
  const failed = typeof intent === 'object' && intent !== null && OVER.includes(intent.status);
  return failed ? 'expired' : 'waiting';
}
