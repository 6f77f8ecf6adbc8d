import type { Stripe } from 'stripe';
import { newId } from './new-id';
import type { SessionRecord, WireLineItem } from './records';
import type { CreateSessionParams, LineItemParams } from './session-params';

function buildLineItem(params: LineItemParams, created: number): WireLineItem {
  const { price_data: price, quantity } = params;
  const total = price.unit_amount * quantity;
  return {
    id: newId('li_'),
    object: 'item',
    adjustable_quantity: null,
    amount_discount: 0,
    amount_subtotal: total,
    amount_tax: 0,
    amount_total: total,
    currency: price.currency,
    description: price.product_data.name,
    metadata: {},
    price: {
      id: newId('price_'),
      object: 'price',
      active: false,
      billing_scheme: 'per_unit',
      created,
      currency: price.currency,
      custom_unit_amount: null,
      livemode: false,
      lookup_key: null,
      metadata: {},
      nickname: null,
      product: newId('prod_'),
      recurring: null,
      tax_behavior: price.tax_behavior,
      tiers_mode: null,
      transform_quantity: null,
      type: 'one_time',
      unit_amount: price.unit_amount,
      unit_amount_decimal: String(price.unit_amount),
    },
    quantity,
  } satisfies WireLineItem;
}

export function customerDetails(email: string): Stripe.Checkout.Session.CustomerDetails {
  return {
    address: null,
    business_name: null,
    email,
    individual_name: null,
    name: null,
    phone: null,
    tax_exempt: 'none',
    tax_ids: null,
  };
}

/** A session as it is when just made: open and unpaid. The PaymentIntent comes with the first attempt to pay. */
export function buildSession(
  params: CreateSessionParams,
  at: { created: number; expiresAt: number; baseUrl: string },
): SessionRecord {
  const lineItems = params.line_items.map((item) => buildLineItem(item, at.created));
  const total = lineItems.reduce((sum, item) => sum + item.amount_total, 0);
  const id = newId('cs_test_');
  const session = {
    id,
    object: 'checkout.session',
    adaptive_pricing: { enabled: false },
    after_expiration: null,
    allow_promotion_codes: params.allow_promotion_codes ?? null,
    allowed_payment_method_types: null,
    amount_subtotal: total,
    amount_total: total,
    automatic_tax: { enabled: false, liability: null, provider: null, status: null },
    billing_address_collection: params.billing_address_collection ?? null,
    cancel_url: params.cancel_url ?? null,
    client_reference_id: params.client_reference_id ?? null,
    client_secret: null,
    collected_information: { business_name: null, individual_name: null, shipping_details: null },
    consent: null,
    consent_collection: null,
    created: at.created,
    currency: lineItems[0]?.currency ?? null,
    currency_conversion: null,
    custom_fields: [],
    custom_text: {
      after_submit: null,
      shipping_address: null,
      submit: null,
      terms_of_service_acceptance: null,
    },
    customer: null,
    customer_account: null,
    customer_creation: params.customer_creation ?? 'if_required',
    customer_details: params.customer_email ? customerDetails(params.customer_email) : null,
    customer_email: params.customer_email ?? null,
    discounts: [],
    expires_at: at.expiresAt,
    integration_identifier: null,
    invoice: null,
    invoice_creation: null,
    livemode: false,
    locale: params.locale ?? null,
    managed_payments: { enabled: false },
    metadata: params.metadata,
    mode: 'payment',
    origin_context: null,
    payment_intent: null,
    payment_link: null,
    payment_method_collection: 'if_required',
    payment_method_configuration_details: null,
    payment_method_options: { card: { request_three_d_secure: 'automatic' } },
    payment_method_types: ['card'],
    payment_status: total === 0 ? 'no_payment_required' : 'unpaid',
    permissions: null,
    phone_number_collection: { enabled: false },
    recovered_from: null,
    saved_payment_method_options: null,
    setup_intent: null,
    shipping_address_collection: null,
    shipping_cost: null,
    shipping_options: [],
    status: 'open',
    submit_type: params.submit_type ?? null,
    subscription: null,
    success_url: params.success_url,
    total_details: { amount_discount: 0, amount_shipping: 0, amount_tax: 0 },
    ui_mode: 'hosted_page',
    url: `${at.baseUrl}/pay/${id}`,
    wallet_options: null,
  } satisfies Stripe.Checkout.Session;
  return { session, lineItems, intentData: { metadata: {}, ...params.payment_intent_data } };
}
