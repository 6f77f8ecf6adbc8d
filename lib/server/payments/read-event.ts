import 'server-only';
import type Stripe from 'stripe';
import { env } from '../env';
import { type ProviderRefund, toProviderRefund } from './provider-refund';
import { type ProviderSession, toProviderSession } from './provider-session';
import { stripeClient } from './stripe-client';

export type ProviderEvent = { id: string; type: string; objectId: string } & (
  | { about: 'session'; session: ProviderSession }
  | { about: 'refund'; refund: ProviderRefund }
  /** A slow payment method that failed after the form was through. */
  | { about: 'failure'; session: ProviderSession }
  | { about: 'other' }
);

/** Seconds that a signature's time may be off, either way. */
const TOLERANCE = 300;

/**
 * A webhook's event, or why it is refused. The signature is made over the raw body, so nothing may parse it first.
 * The SDK checks that a signature is not too old but lets any time in the future pass; that is checked here.
 */
export function readEvent(
  body: string,
  signature: string | null,
  now: number,
): { ok: true; value: ProviderEvent } | { ok: false; error: 'no_signature' | 'bad_signature' | 'bad_time' } {
  if (!signature) return { ok: false, error: 'no_signature' };
  // One time only: with two, the SDK and this check might look at different ones.
  const [signedAt, second] = [...signature.matchAll(/(?:^|,)\s*t=(\d+)/g)].map((found) => Number(found[1]));
  if (signedAt === undefined || second !== undefined || Math.abs(now / 1000 - signedAt) > TOLERANCE)
    return { ok: false, error: 'bad_time' };
  let event: Stripe.Event;
  try {
    event = stripeClient().webhooks.constructEvent(
      body,
      signature,
      env().STRIPE_WEBHOOK_SECRET,
      TOLERANCE,
      undefined,
      now,
    );
  } catch {
    return { ok: false, error: 'bad_signature' };
  }
  return { ok: true, value: toProviderEvent(event) };
}

function toProviderEvent(event: Stripe.Event): ProviderEvent {
  const object = event.data.object as { id?: string };
  const head = { id: event.id, type: event.type, objectId: object.id ?? '' };
  switch (event.type) {
    case 'checkout.session.completed':
    case 'checkout.session.async_payment_succeeded':
    case 'checkout.session.expired':
      return { ...head, about: 'session', session: toProviderSession(event.data.object) };
    case 'checkout.session.async_payment_failed':
      return { ...head, about: 'failure', session: toProviderSession(event.data.object) };
    case 'refund.created':
    case 'refund.updated':
    case 'refund.failed':
      return { ...head, about: 'refund', refund: toProviderRefund(event.data.object) };
    default:
      return { ...head, about: 'other' };
  }
}
