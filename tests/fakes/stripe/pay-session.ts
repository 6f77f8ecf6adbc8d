import type { Stripe } from 'stripe';
import { buildBalance } from './build-balance';
import { buildCharge, type Decline } from './build-charge';
import { buildIntent } from './build-intent';
import { customerDetails } from './build-session';
import { emitEvent } from './emit-event';
import { type Mock, noCause, seconds } from './mock';
import { newId } from './new-id';
import type { SessionRecord } from './records';

export const outcomes = ['pay', 'decline', 'decline-funds', 'needs-step', 'approve', 'refuse'] as const;
export type Outcome = (typeof outcomes)[number];

// Codes of the published list "Decline codes"; the sentences are ours.
const declines = {
  decline: {
    code: 'card_declined',
    declineCode: 'generic_decline',
    message: 'The bank declined this payment.',
    seller: 'The bank returned the decline code `generic_decline`.',
  },
  'decline-funds': {
    code: 'card_declined',
    declineCode: 'insufficient_funds',
    message: 'The bank declined this payment: there is not enough money in the account.',
    seller: 'The bank returned the decline code `insufficient_funds`.',
  },
} satisfies Record<string, Decline>;

function putIntent(mock: Mock, intent: Stripe.PaymentIntent): Stripe.PaymentIntent {
  mock.store.put('intent', intent.id, intent);
  return intent;
}

export function intentOf(mock: Mock, { session }: SessionRecord): Stripe.PaymentIntent | undefined {
  return typeof session.payment_intent === 'string'
    ? mock.store.get('intent', session.payment_intent)
    : undefined;
}

/** The session's intent; the first attempt makes it. */
function attemptIntent(mock: Mock, record: SessionRecord): Stripe.PaymentIntent {
  const known = intentOf(mock, record);
  if (known) return known;
  const intent = putIntent(mock, buildIntent(record, seconds(mock)));
  const session = { ...record.session, payment_intent: intent.id };
  mock.store.put('session', session.id, { ...record, session });
  emitEvent(mock, noCause, 'payment_intent.created', intent);
  return intent;
}

function complete(mock: Mock, sessionId: string, email: string | null): void {
  const record = mock.store.get('session', sessionId);
  if (!record) return;
  const { session } = record;
  const done: Stripe.Checkout.Session = {
    ...session,
    customer_details: session.customer_details ?? (email ? customerDetails(email) : null),
    payment_status: session.amount_total === 0 ? 'no_payment_required' : 'paid',
    status: 'complete',
    url: null,
  };
  mock.store.put('session', sessionId, { ...record, session: done });
  emitEvent(mock, noCause, 'checkout.session.completed', done);
}

function charge(
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

function fail(mock: Mock, intent: Stripe.PaymentIntent, error: Stripe.PaymentIntent.LastPaymentError): void {
  const failed = putIntent(mock, {
    ...intent,
    last_payment_error: error,
    next_action: null,
    payment_method: null,
    status: 'requires_payment_method',
  });
  emitEvent(mock, noCause, 'payment_intent.payment_failed', failed);
}

function declineWith(
  mock: Mock,
  record: SessionRecord,
  intent: Stripe.PaymentIntent,
  decline: Decline,
): void {
  const failed = buildCharge(
    intent,
    { created: seconds(mock), email: record.session.customer_email, receiptBase: '', threeDSecure: false },
    decline,
  );
  mock.store.put('charge', failed.id, failed);
  emitEvent(mock, noCause, 'charge.failed', failed);
  fail(
    mock,
    { ...intent, latest_charge: failed.id },
    {
      type: 'card_error',
      charge: failed.id,
      code: 'card_declined',
      decline_code: decline.declineCode,
      message: decline.message,
    },
  );
}

function askForStep(mock: Mock, record: SessionRecord, intent: Stripe.PaymentIntent): void {
  const url = `${mock.baseUrl}/pay/${record.session.id}/confirm`;
  const waiting = putIntent(mock, {
    ...intent,
    last_payment_error: null,
    next_action: {
      type: 'redirect_to_url',
      redirect_to_url: { url, return_url: `${mock.baseUrl}/pay/${record.session.id}` },
    },
    payment_method: newId('pm_'),
    status: 'requires_action',
  });
  emitEvent(mock, noCause, 'payment_intent.requires_action', waiting);
}

/**
 * Plays one outcome on an open session. False when it no longer applies: the session is complete or expired, or the
 * bank's step was answered without one being asked. The caller commits.
 */
export function paySession(mock: Mock, sessionId: string, outcome: Outcome, email: string | null): boolean {
  const record = mock.store.get('session', sessionId);
  if (record?.session.status !== 'open') return false;
  const payer = record.session.customer_email ?? email;
  const waiting = intentOf(mock, record)?.status === 'requires_action';
  if ((outcome === 'approve' || outcome === 'refuse') && !waiting) return false;
  if (record.session.amount_total === 0) {
    if (outcome === 'pay') complete(mock, sessionId, payer);
    return outcome === 'pay';
  }
  const intent = attemptIntent(mock, record);
  if (outcome === 'pay' || outcome === 'approve') {
    charge(mock, record, intent, payer, outcome === 'approve');
    complete(mock, sessionId, payer);
  } else if (outcome === 'needs-step') askForStep(mock, record, intent);
  else if (outcome === 'refuse')
    fail(mock, intent, {
      type: 'invalid_request_error',
      code: 'payment_intent_authentication_failure',
      message: 'The bank’s confirmation was refused, so nothing was paid.',
    });
  else declineWith(mock, record, intent, declines[outcome]);
  return true;
}
