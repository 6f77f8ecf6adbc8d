import type { Stripe } from 'stripe';
import { z } from 'zod';
import { badRequest, noSuch, refused } from './api-error';
import { buildBalance } from './build-balance';
import { formatMoney } from './currency-rules';
import { emitEvent } from './emit-event';
import { type Cause, type Mock, seconds } from './mock';
import { letters, newId } from './new-id';
import type { FormObject } from './parse-form';
import { expandable, integer, metadata, parseParams, text } from './parse-params';
import { takeFault } from './take-fault';

const createRefundParams = z.strictObject({
  ...expandable,
  payment_intent: text().optional(),
  charge: text().optional(),
  amount: integer(1).optional(),
  reason: z.enum(['duplicate', 'fraudulent', 'requested_by_customer']).optional(),
  metadata: metadata.default({}),
});

function findCharge(mock: Mock, params: z.output<typeof createRefundParams>): Stripe.Charge {
  const { charge: chargeId, payment_intent: intentId } = params;
  if (chargeId === undefined && intentId === undefined)
    throw badRequest(
      'One of the following params should be provided for this request: payment_intent or charge.',
    );
  const intent = intentId === undefined ? undefined : mock.store.get('intent', intentId);
  if (intentId !== undefined && !intent) throw noSuch('payment_intent', intentId, 'payment_intent');
  if (intent && intent.status !== 'succeeded')
    throw refused(`This PaymentIntent (${intent.id}) does not have a successful charge to refund.`, {
      param: 'payment_intent',
    });
  const id = chargeId ?? String(intent?.latest_charge);
  const charge = mock.store.get('charge', id);
  if (!charge) throw noSuch('charge', id, 'charge');
  if (intent && charge.payment_intent !== intent.id)
    throw badRequest('The charge does not belong to the PaymentIntent.', { param: 'charge' });
  if (!charge.paid)
    throw refused(`Charge ${charge.id} was not paid, so it cannot be refunded.`, { param: 'charge' });
  return charge;
}

export function createRefund(mock: Mock, form: FormObject, cause: Cause) {
  const params = parseParams(createRefundParams, form);
  const charge = findCharge(mock, params);
  const left = charge.amount - charge.amount_refunded;
  if (left === 0)
    throw refused(`Charge ${charge.id} has already been refunded.`, { code: 'charge_already_refunded' });
  const amount = params.amount ?? left;
  if (amount > left)
    throw refused(
      `Refund amount (${formatMoney(amount, charge.currency)}) is greater than unrefunded amount on charge (${formatMoney(left, charge.currency)})`,
      { param: 'amount' },
    );
  const fate = takeFault(mock, ['refund-pending', 'refund-fails'])?.kind;
  const created = seconds(mock);
  const refund = {
    id: newId('re_'),
    object: 'refund',
    amount,
    balance_transaction: null,
    charge: charge.id,
    created,
    currency: charge.currency,
    customer: null,
    customer_account: null,
    destination_details: {
      card: { reference_status: 'pending', reference_type: 'acquirer_reference_number', type: 'refund' },
      type: 'card',
    },
    metadata: params.metadata,
    payment_intent: charge.payment_intent,
    payment_method: null,
    reason: params.reason ?? null,
    receipt_number: null,
    source_transfer_reversal: null,
    status: fate ? 'pending' : 'succeeded',
    transfer_reversal: null,
    ...(fate ? { pending_reason: 'processing' as const } : {}),
  } satisfies Stripe.Refund;
  const balance = buildBalance(refund, created, 'refund');
  const kept = { ...refund, balance_transaction: balance.id };
  mock.store.put('balance', balance.id, balance);
  mock.store.put('refund', kept.id, kept);
  // Pending refunds count: together they may never exceed what was charged.
  const refundedTotal = charge.amount_refunded + amount;
  const after = { ...charge, amount_refunded: refundedTotal, refunded: refundedTotal === charge.amount };
  mock.store.put('charge', charge.id, after);
  emitEvent(mock, cause, 'refund.created', kept);
  emitEvent(mock, cause, 'charge.refunded', after, {
    amount_refunded: charge.amount_refunded,
    refunded: charge.refunded,
  });
  if (!fate) addReference(mock, kept.id, cause);
  if (fate === 'refund-fails') settleRefund(mock, kept.id, 'failed', cause);
  return { object: mock.store.get('refund', kept.id) ?? kept, expand: params.expand };
}

/** The bank's reference arrives a moment after the refund: the usual reason for a refund.updated. */
function addReference(mock: Mock, id: string, cause: Cause): void {
  const refund = mock.store.get('refund', id);
  if (!refund) return;
  const { destination_details: before } = refund;
  const card = {
    reference: letters(23),
    reference_status: 'available',
    reference_type: 'acquirer_reference_number',
  };
  const updated: Stripe.Refund = {
    ...refund,
    destination_details: { card: { ...card, type: 'refund' }, type: 'card' },
  };
  mock.store.put('refund', id, updated);
  emitEvent(mock, cause, 'refund.updated', updated, { destination_details: before });
}

/** Ends a pending refund. A failed one gives the amount back to the charge, so that it can be refunded again. */
export function settleRefund(mock: Mock, id: string, status: 'succeeded' | 'failed', cause: Cause): boolean {
  const refund = mock.store.get('refund', id);
  if (refund?.status !== 'pending') return false;
  const { pending_reason: _gone, ...rest } = refund;
  if (status === 'succeeded') {
    const settled = { ...rest, status };
    mock.store.put('refund', id, settled);
    emitEvent(mock, cause, 'refund.updated', settled, { status: 'pending' });
    addReference(mock, id, cause);
    return true;
  }
  const balance = buildBalance(refund, seconds(mock), 'refund_failure');
  mock.store.put('balance', balance.id, balance);
  const failed = { ...rest, status, failure_reason: 'unknown', failure_balance_transaction: balance.id };
  mock.store.put('refund', id, failed);
  const charge = mock.store.get('charge', String(refund.charge));
  if (charge)
    mock.store.put('charge', charge.id, {
      ...charge,
      amount_refunded: charge.amount_refunded - refund.amount,
      refunded: false,
    });
  emitEvent(mock, cause, 'refund.failed', failed);
  emitEvent(mock, cause, 'refund.updated', failed, { status: 'pending' });
  return true;
}
