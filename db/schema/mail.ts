import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { Id } from '@/lib/domain/shared/ids';

export const MAIL_KINDS = [
  'verify',
  'known-address',
  'reset',
  'account-changed',
  'invite',
  'order-confirmed',
  'packing-list',
  'late-payment',
  'booking-link',
] as const;
export type MailKind = (typeof MAIL_KINDS)[number];

/** Outbox: a row is written in the transaction that causes the mail and drained by the background runner. */
export const mail = sqliteTable(
  'mail',
  {
    id: text('id').$type<Id<'mail'>>().primaryKey(),
    kind: text('kind').$type<MailKind>().notNull(),
    toName: text('to_name').notNull(),
    toEmail: text('to_email').notNull(),
    /** Ids and, for account links, the raw token; emptied once sent. */
    payload: text('payload', { mode: 'json' }).$type<Record<string, string>>().notNull(),
    state: text('state').$type<'queued' | 'sent' | 'failed'>().notNull().default('queued'),
    attempts: integer('attempts').notNull().default(0),
    nextAttemptAt: integer('next_attempt_at').notNull(),
    /** A runner that holds it past this time is taken for dead. */
    leasedUntil: integer('leased_until'),
    lastError: text('last_error'),
    createdAt: integer('created_at').notNull(),
    sentAt: integer('sent_at'),
  },
  (t) => [index('mail_due').on(t.state, t.nextAttemptAt)],
);
