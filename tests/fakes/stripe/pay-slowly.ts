import type { Stripe } from 'stripe';
import { attemptIntent, chargeIntent, completeSession, failIntent, intentOf } from './attempt-payment';
import { emitEvent } from './emit-event';
import { type Mock, noCause } from './mock';
import type { SessionRecord } from './records';

/** A slow method (a bank debit): the page is through, the session complete and unpaid, the money still on its way. */
export function paySlowly(mock: Mock, record: SessionRecord, email: string | null): void {
  const intent = attemptIntent(mock, record);
  const processing: Stripe.PaymentIntent = {
    ...intent,
    last_payment_error: null,
    next_action: null,
    status: 'processing',
  };
  mock.store.put('intent', intent.id, processing);
  emitEvent(mock, noCause, 'payment_intent.processing', processing);
  completeSession(mock, record.session.id, email, 'unpaid');
}

/** The slow money arrives or does not. False when none is on its way for this session. */
export function settleSlowPayment(mock: Mock, sessionId: string, status: 'succeeded' | 'failed'): boolean {
  const record = mock.store.get('session', sessionId);
  const intent = record && intentOf(mock, record);
  if (!record || intent?.status !== 'processing') return false;
  if (status === 'failed') {
    failIntent(mock, intent, {
      type: 'invalid_request_error',
      code: 'payment_intent_payment_attempt_failed',
      message: 'The bank did not send the money.',
    });
    emitEvent(mock, noCause, 'checkout.session.async_payment_failed', record.session);
    return true;
  }
  chargeIntent(mock, record, intent, record.session.customer_details?.email ?? null, false);
  const session = { ...record.session, payment_status: 'paid' as const };
  mock.store.put('session', sessionId, { ...record, session });
  emitEvent(mock, noCause, 'checkout.session.async_payment_succeeded', session);
  return true;
}
