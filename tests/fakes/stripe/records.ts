import type { Stripe } from 'stripe';

/** On the wire a decimal is a string; the SDK's type is what it turns into. */
export type WirePrice = Omit<Stripe.Price, 'unit_amount_decimal'> & { unit_amount_decimal: string };
export type WireLineItem = Omit<Stripe.LineItem, 'price'> & { price: WirePrice };

export type IntentData = {
  description?: string;
  metadata: Record<string, string>;
  receipt_email?: string;
  statement_descriptor?: string;
  statement_descriptor_suffix?: string;
};

/** Related objects are kept as ids and put in place only when a request expands them. */
export type SessionRecord = {
  session: Stripe.Checkout.Session;
  lineItems: WireLineItem[];
  intentData: IntentData;
};

export type EventRecord = {
  id: string;
  object: 'event';
  api_version: string;
  created: number;
  data: { object: object; previous_attributes?: object };
  livemode: false;
  pending_webhooks: number;
  request: { id: string | null; idempotency_key: string | null };
  type: string;
};

/** pending: will be sent at nextAt · held: waits for a person or test · delivered: got a 2xx · dropped: never sent. */
export type DeliveryState = 'pending' | 'held' | 'delivered' | 'dropped';
export type Delivery = {
  id: string;
  /** Order of creation: several events share one second. */
  seq: number;
  state: DeliveryState;
  /** How many times each sending is repeated, for tests of repetition. */
  times: number;
  nextAt: number;
  attempts: { at: number; status: number | null; error: string | null }[];
};

export type SavedAnswer = {
  fingerprint: string;
  status: number;
  body: string;
  requestId: string;
  at: number;
};

export type WebhookSwitches = { hold: boolean; dropNext: number; times: number };

export const faultKinds = [
  'rate-limit',
  'server-error',
  'timeout-before-work',
  'timeout-after-success',
  'cut-after-success',
  'refund-pending',
  'refund-fails',
] as const;
export type FaultKind = (typeof faultKinds)[number];
export type Fault = { kind: FaultKind; remaining: number; method?: string; path?: string };

export type Tables = {
  session: SessionRecord;
  intent: Stripe.PaymentIntent;
  charge: Stripe.Charge;
  refund: Stripe.Refund;
  balance: Stripe.BalanceTransaction;
  event: EventRecord;
  delivery: Delivery;
  answer: SavedAnswer;
};
