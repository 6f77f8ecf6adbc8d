import type { Stripe } from 'stripe';
import { newId } from './new-id';

export type Decline = { code: string; declineCode: string; message: string; seller: string };

/** A charge that went through, or with `decline` one that the bank refused. */
export function buildCharge(
  intent: Stripe.PaymentIntent,
  context: { created: number; email: string | null; receiptBase: string; threeDSecure: boolean },
  decline?: Decline,
): Stripe.Charge {
  const id = newId('ch_');
  const paid = decline === undefined;
  return {
    id,
    object: 'charge',
    amount: intent.amount,
    amount_captured: paid ? intent.amount : 0,
    amount_refunded: 0,
    application: null,
    application_fee: null,
    application_fee_amount: null,
    balance_transaction: null,
    billing_details: { address: null, email: context.email, name: null, phone: null, tax_id: null },
    calculated_statement_descriptor: intent.statement_descriptor,
    captured: paid,
    created: context.created,
    currency: intent.currency,
    customer: null,
    description: intent.description,
    disputed: false,
    failure_balance_transaction: null,
    failure_code: decline?.code ?? null,
    failure_message: decline?.message ?? null,
    fraud_details: {},
    livemode: false,
    metadata: intent.metadata,
    on_behalf_of: null,
    outcome: {
      advice_code: null,
      network_advice_code: null,
      network_decline_code: null,
      network_status: paid ? 'approved_by_network' : 'declined_by_network',
      reason: decline?.declineCode ?? null,
      risk_level: 'normal',
      seller_message: decline?.seller ?? 'Payment complete.',
      type: paid ? 'authorized' : 'issuer_declined',
    },
    paid,
    payment_intent: intent.id,
    payment_method: newId('pm_'),
    payment_method_details: { card: cardDetails(intent.amount, context.threeDSecure), type: 'card' },
    receipt_email: intent.receipt_email,
    receipt_number: null,
    receipt_url: paid ? `${context.receiptBase}` : null,
    refunded: false,
    review: null,
    shipping: null,
    source: null,
    source_transfer: null,
    statement_descriptor: intent.statement_descriptor,
    statement_descriptor_suffix: intent.statement_descriptor_suffix,
    status: paid ? 'succeeded' : 'failed',
    transfer_data: null,
    transfer_group: null,
  } satisfies Stripe.Charge;
}

/** No card was asked for, so none is invented beyond the fields that must be there. */
function cardDetails(amount: number, challenged: boolean): Stripe.Charge.PaymentMethodDetails.Card {
  return {
    amount_authorized: amount,
    authorization_code: null,
    brand: 'unknown',
    checks: { address_line1_check: null, address_postal_code_check: null, cvc_check: null },
    country: null,
    electronic_commerce_indicator: null,
    exp_month: 12,
    exp_year: 2099,
    fingerprint: null,
    funding: 'unknown',
    installments: null,
    last4: '0000',
    mandate: null,
    network: null,
    network_transaction_id: null,
    regulated_status: 'unregulated',
    three_d_secure: challenged
      ? {
          authentication_flow: 'challenge',
          electronic_commerce_indicator: null,
          exemption_indicator: null,
          result: 'authenticated',
          result_reason: null,
          transaction_id: null,
          version: '2.2.0',
        }
      : null,
    transaction_link_id: null,
    wallet: null,
  };
}
