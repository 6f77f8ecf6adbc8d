import 'server-only';
import Stripe from 'stripe';
import { env } from '../env';

const held = globalThis as typeof globalThis & { combwoodStripe?: { key: string; client: Stripe } };

/** The SDK, set up once. Only this folder imports it: another provider would be another folder like this. */
export function stripeClient(): Stripe {
  const { STRIPE_SECRET_KEY, STRIPE_API_URL } = env();
  const key = `${STRIPE_SECRET_KEY} ${STRIPE_API_URL ?? ''}`;
  if (held.combwoodStripe?.key === key) return held.combwoodStripe.client;
  const at = STRIPE_API_URL ? new URL(STRIPE_API_URL) : null;
  const client = new Stripe(STRIPE_SECRET_KEY, {
    // A person is waiting: one quick second try under the same idempotency key, then words.
    maxNetworkRetries: 1,
    timeout: 8_000,
    telemetry: false,
    ...(at && {
      protocol: at.protocol === 'http:' ? 'http' : 'https',
      host: at.hostname,
      port: at.port === '' ? (at.protocol === 'http:' ? 80 : 443) : Number(at.port),
    }),
  });
  held.combwoodStripe = { key, client };
  return client;
}
