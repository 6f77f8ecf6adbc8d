import { refused } from './api-error';
import { intentOf } from './attempt-payment';
import { emitEvent } from './emit-event';
import { type Cause, commit, type Mock, noCause, seconds } from './mock';
import type { SessionRecord } from './records';

/** The one arbiter between paying and letting go: only an open session expires, otherwise an error. */
export function expireSession(mock: Mock, record: SessionRecord, cause: Cause): SessionRecord {
  const { session } = record;
  if (session.status !== 'open')
    throw refused(
      `Only Checkout Sessions with a status in ["open"] can be expired. This Checkout Session has a status of \`${session.status}\`.`,
    );
  const intent = intentOf(mock, record);
  if (intent) {
    const canceled = {
      ...intent,
      canceled_at: seconds(mock),
      cancellation_reason: 'expired',
      next_action: null,
      status: 'canceled',
    };
    mock.store.put('intent', intent.id, canceled);
    emitEvent(mock, cause, 'payment_intent.canceled', canceled);
  }
  const expired = { ...record, session: { ...session, status: 'expired' as const, url: null } };
  mock.store.put('session', session.id, expired);
  emitEvent(mock, cause, 'checkout.session.expired', expired.session);
  return expired;
}

/** Ends every open session whose time is over. */
export function expireDue(mock: Mock): void {
  for (const record of mock.store.all('session')) {
    const { status, expires_at: at } = record.session;
    if (status === 'open' && at <= seconds(mock)) expireSession(mock, record, noCause);
  }
  commit(mock);
}
