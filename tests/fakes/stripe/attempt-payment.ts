import type { Stripe } from 'stripe';
import { buildBalance } from './build-balance';
import { buildCharge } from './build-charge';
import { buildIntent } from './build-intent';
import { customerDetails } from './build-session';
import { emitEvent } from './emit-event';
import { type Mock, noCause, seconds } from './mock';
import type { SessionRecord } from './records';

export function putIntent(mock: Mock, intent: Stripe.PaymentIntent): Stripe.PaymentIntent {
  mock.store.put('intent', intent.id, intent);
  return intent;
}

export function intentOf(mock: Mock, { session }: SessionRecord): Stripe.PaymentIntent | undefined {
  return typeof session.payment_intent === 'string'
    ? mock.store.get('intent', session.payment_intent)
    : undefined;
}

/** The session's intent; the first attempt makes it. */
export function attemptIntent(mock: Mock, record: SessionRecord): Stripe.PaymentIntent {
  const known = intentOf(mock, record);
  if (known) return known;
  const intent = putIntent(mock, buildIntent(record, seconds(mock)));
  const session = { ...record.session, payment_intent: intent.id };
  mock.store.put('session', session.id, { ...record, session });
  emitEvent(mock, noCause, 'payment_intent.created', intent);
  return intent;
}

export function completeSession(
  mock: Mock,
  sessionId: string,
  email: string | null,
  paymentStatus: Stripe.Checkout.Session.PaymentStatus,
): void {
  const record = mock.store.get('session', sessionId);
  if (!record) return;
  const { session } = record;
  const done: Stripe.Checkout.Session = {
    ...session,
    customer_details: session.customer_details ?? (email ? customerDetails(email) : null),
    payment_status: paymentStatus,
    status: 'complete',
    url: null,
  };
  mock.store.put('session', sessionId, { ...record, session: done });
  emitEvent(mock, noCause, 'checkout.session.completed', done);
}

export function chargeIntent(
  mock: Mock,
  record: SessionRecord,
  intent: Stripe.PaymentIntent,
  email: string | null,
  challenged: boolean,
): void {
  const created = seconds(mock);
  const made = buildCharge(intent, {
    created,
    email,
    receiptBase: `${mock.baseUrl}/pay/${record.session.id}`,
    threeDSecure: challenged,
  });
  const balance = buildBalance(made, created, 'charge');
  const settled = { ...made, balance_transaction: balance.id };
  mock.store.put('balance', balance.id, balance);
  mock.store.put('charge', settled.id, settled);
  const paid = putIntent(mock, {
    ...intent,
    amount_received: intent.amount,
    last_payment_error: null,
    latest_charge: settled.id,
    next_action: null,
    payment_method: settled.payment_method,
    status: 'succeeded',
  });
  emitEvent(mock, noCause, 'charge.succeeded', settled);
  emitEvent(mock, noCause, 'payment_intent.succeeded', paid);
}

export function failIntent(
  mock: Mock,
  intent: Stripe.PaymentIntent,
  error: Stripe.PaymentIntent.LastPaymentError,
): void {
  const failed = putIntent(mock, {
    ...intent,
    last_payment_error: error,
    next_action: null,
    payment_method: null,
    status: 'requires_payment_method',
  });
  emitEvent(mock, noCause, 'payment_intent.payment_failed', failed);
}
