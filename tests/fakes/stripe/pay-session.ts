import type { Stripe } from 'stripe';
import {
  attemptIntent,
  chargeIntent,
  completeSession,
  failIntent,
  intentOf,
  putIntent,
} from './attempt-payment';
import { buildCharge, type Decline } from './build-charge';
import { emitEvent } from './emit-event';
import { type Mock, noCause, seconds } from './mock';
import { newId } from './new-id';
import { paySlowly } from './pay-slowly';
import type { SessionRecord } from './records';

export const outcomes = [
  'pay',
  'pay-later',
  'decline',
  'decline-funds',
  'needs-step',
  'approve',
  'refuse',
] as const;
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
  failIntent(
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
    if (outcome === 'pay') completeSession(mock, sessionId, payer, 'no_payment_required');
    return outcome === 'pay';
  }
  if (outcome === 'pay-later') {
    paySlowly(mock, record, payer);
    return true;
  }
  const intent = attemptIntent(mock, record);
  if (outcome === 'pay' || outcome === 'approve') {
    chargeIntent(mock, record, intent, payer, outcome === 'approve');
    completeSession(mock, sessionId, payer, 'paid');
  } else if (outcome === 'needs-step') askForStep(mock, record, intent);
  else if (outcome === 'refuse')
    failIntent(mock, intent, {
      type: 'invalid_request_error',
      code: 'payment_intent_authentication_failure',
      message: 'The bank’s confirmation was refused, so nothing was paid.',
    });
  else declineWith(mock, record, intent, declines[outcome]);
  return true;
}
