import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import type { Id, OrderId, OrganisationId } from '@/lib/domain/shared/ids';
import type { Minor } from '@/lib/domain/shared/money';
import { order } from './order';
import { organisation } from './organisation';

/** One attempt to pay an order through the provider. */
export const payment = sqliteTable(
  'payment',
  {
    id: text('id').$type<Id<'pay'>>().primaryKey(),
    orderId: text('order_id')
      .$type<OrderId>()
      .notNull()
      .references(() => order.id),
    state: text('state').$type<'opening' | 'open' | 'captured' | 'expired'>().notNull(),
    amount: integer('amount').$type<Minor>().notNull(),
    currency: text('currency').notNull(),
    /** The provider's Checkout Session; null until it answered. */
    sessionId: text('session_id'),
    intentId: text('intent_id'),
    url: text('url'),
    createdAt: integer('created_at').notNull(),
    updatedAt: integer('updated_at').notNull(),
  },
  (t) => [
    uniqueIndex('payment_session').on(t.sessionId),
    index('payment_order').on(t.orderId),
    index('payment_intent').on(t.intentId),
  ],
);

export const refund = sqliteTable(
  'refund',
  {
    id: text('id').$type<Id<'rfd'>>().primaryKey(),
    orderId: text('order_id')
      .$type<OrderId>()
      .notNull()
      .references(() => order.id),
    paymentId: text('payment_id')
      .$type<Id<'pay'>>()
      .notNull()
      .references(() => payment.id),
    amount: integer('amount').$type<Minor>().notNull(),
    currency: text('currency').notNull(),
    /** owed: not yet asked of the provider (the id is the idempotency key) · pending: asked · succeeded · failed: owed again by a new row. */
    state: text('state').$type<'owed' | 'pending' | 'succeeded' | 'failed'>().notNull(),
    reason: text('reason').notNull(),
    providerRefundId: text('provider_refund_id'),
    attempts: integer('attempts').notNull().default(0),
    nextAttemptAt: integer('next_attempt_at').notNull(),
    createdAt: integer('created_at').notNull(),
    updatedAt: integer('updated_at').notNull(),
  },
  (t) => [
    index('refund_order').on(t.orderId),
    uniqueIndex('refund_provider').on(t.providerRefundId),
    index('refund_due').on(t.state, t.nextAttemptAt),
  ],
);

/** Every provider event once; inserted in the same transaction as its effect. */
export const paymentEvent = sqliteTable(
  'payment_event',
  {
    /** The provider's event id. */
    id: text('id').primaryKey(),
    type: text('type').notNull(),
    objectId: text('object_id').notNull(),
    orderId: text('order_id').$type<OrderId>(),
    /** set-aside waits for a person: wrong amount, unknown order. */
    outcome: text('outcome').$type<'applied' | 'ignored' | 'set-aside'>().notNull(),
    reason: text('reason').notNull().default(''),
    receivedAt: integer('received_at').notNull(),
  },
  (t) => [index('payment_event_object').on(t.type, t.objectId), index('payment_event_outcome').on(t.outcome)],
);

/** provider: money at the payment provider · payers: what payers owe us · income: what camps earned. */
export type LedgerAccount = 'provider' | 'payers' | 'income';

/** Double entry, append-only (a trigger refuses change): rows of one `posting` sum to zero. Debit positive. */
export const ledger = sqliteTable(
  'ledger',
  {
    id: text('id').$type<Id<'led'>>().primaryKey(),
    posting: text('posting').notNull(),
    organisationId: text('organisation_id')
      .$type<OrganisationId>()
      .notNull()
      .references(() => organisation.id),
    orderId: text('order_id')
      .$type<OrderId>()
      .notNull()
      .references(() => order.id),
    account: text('account').$type<LedgerAccount>().notNull(),
    amount: integer('amount').$type<Minor>().notNull(),
    currency: text('currency').notNull(),
    /** Why in words: "Place sold", "Paid by card", "Refund". */
    memo: text('memo').notNull(),
    /** What caused it: a payment, refund or order id. One posting a cause and memo. */
    cause: text('cause').notNull(),
    at: integer('at').notNull(),
  },
  (t) => [
    index('ledger_order').on(t.orderId),
    index('ledger_organisation').on(t.organisationId, t.at),
    uniqueIndex('ledger_once').on(t.cause, t.memo, t.account),
  ],
);

/** Numbered without gaps per organisation. */
export const receipt = sqliteTable(
  'receipt',
  {
    id: text('id').$type<Id<'rcp'>>().primaryKey(),
    organisationId: text('organisation_id')
      .$type<OrganisationId>()
      .notNull()
      .references(() => organisation.id),
    orderId: text('order_id')
      .$type<OrderId>()
      .notNull()
      .references(() => order.id),
    paymentId: text('payment_id')
      .$type<Id<'pay'>>()
      .notNull()
      .references(() => payment.id),
    number: integer('number').notNull(),
    amount: integer('amount').$type<Minor>().notNull(),
    currency: text('currency').notNull(),
    issuedAt: integer('issued_at').notNull(),
  },
  (t) => [
    uniqueIndex('receipt_number').on(t.organisationId, t.number),
    uniqueIndex('receipt_payment').on(t.paymentId),
    index('receipt_order').on(t.orderId),
  ],
);
