import 'server-only';
import { ok, type Result } from '@/lib/domain/shared/result';
import { type ProviderError, toProviderError } from './provider-error';
import { type ProviderSession, toProviderSession } from './provider-session';
import { stripeClient } from './stripe-client';

export type SessionAsk = {
  paymentId: string;
  orderId: string;
  reference: string;
  payerEmail: string;
  currency: string;
  lines: { label: string; unit: number; quantity: number }[];
  successUrl: string;
  cancelUrl: string;
  /** Epoch ms at which the payment row was written: everything sent follows from it, so that a repeat is the same request. */
  createdAt: number;
};

/**
 * The provider takes 30 minutes to 24 hours. A hold is at most 30 minutes and ends its session itself; the rest is
 * slack for asking again after a crash.
 */
const OPEN_FOR_SECONDS = 90 * 60;

/** Opens a Checkout Session. The payment's id is the idempotency key: asked twice, it is the same session. */
export async function createSession(ask: SessionAsk): Promise<Result<ProviderSession, ProviderError>> {
  const metadata = { orderId: ask.orderId, paymentId: ask.paymentId };
  try {
    const session = await stripeClient().checkout.sessions.create(
      {
        mode: 'payment',
        line_items: ask.lines.map(({ label, unit, quantity }) => ({
          quantity,
          price_data: {
            currency: ask.currency.toLowerCase(),
            unit_amount: unit,
            product_data: { name: label.slice(0, 250) },
          },
        })),
        customer_email: ask.payerEmail,
        client_reference_id: ask.reference,
        metadata,
        payment_intent_data: { metadata, description: `Order ${ask.reference}` },
        success_url: ask.successUrl,
        cancel_url: ask.cancelUrl,
        expires_at: Math.floor(ask.createdAt / 1000) + OPEN_FOR_SECONDS,
      },
      { idempotencyKey: ask.paymentId },
    );
    return ok(toProviderSession(session));
  } catch (error) {
    return toProviderError(error, 'session.create');
  }
}
