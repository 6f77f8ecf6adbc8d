import Stripe from 'stripe';
import type { StripeMock } from '@/tests/fakes/stripe/start-stripe-mock';

export const stripeClient = (mock: StripeMock, key = 'sk_test_tests', options: Stripe.StripeConfig = {}) =>
  new Stripe(key, {
    host: '127.0.0.1',
    port: mock.port,
    protocol: 'http',
    maxNetworkRetries: 1,
    timeout: 8000,
    telemetry: false,
    ...options,
  });

export const line = (name: string, unit_amount: number, quantity = 1, currency = 'usd') => ({
  quantity,
  price_data: { currency, unit_amount, product_data: { name } },
});

export const sessionParams = (
  overrides: Partial<Stripe.Checkout.SessionCreateParams> = {},
): Stripe.Checkout.SessionCreateParams => ({
  mode: 'payment',
  line_items: [line('Kettle Lake Harp Week, Beginner track', 48_000), line('Bed in the lodge', 9_000, 2)],
  client_reference_id: 'ord_test1',
  customer_email: 'mina.okafor@example.test',
  success_url: 'http://127.0.0.1:9/paid?session={CHECKOUT_SESSION_ID}',
  cancel_url: 'http://127.0.0.1:9/back',
  metadata: { order: 'ord_test1' },
  payment_intent_data: { metadata: { order: 'ord_test1' } },
  ...overrides,
});

/** Presses a switch of the stand-in. */
export async function control(mock: StripeMock, method: string, path: string, body?: object) {
  const answer = await fetch(`${mock.url}/_mock/${path}`, {
    method,
    ...(body ? { body: JSON.stringify(body), headers: { 'content-type': 'application/json' } } : {}),
  });
  return { status: answer.status, body: (await answer.json()) as Record<string, unknown> };
}
