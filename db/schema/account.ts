import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import type { Id, UserId } from '@/lib/domain/shared/ids';

export const user = sqliteTable(
  'user',
  {
    id: text('id').$type<UserId>().primaryKey(),
    /** Trimmed and lower-cased; unique. */
    email: text('email').notNull(),
    name: text('name').notNull(),
    /** Argon2id, encoded form. */
    passwordHash: text('password_hash').notNull(),
    /** Null until the address is proven. */
    emailVerifiedAt: integer('email_verified_at'),
    disabledAt: integer('disabled_at'),
    createdAt: integer('created_at').notNull(),
  },
  (t) => [uniqueIndex('user_email').on(t.email)],
);

/** lucia's table: `id` is the SHA-256 of the cookie's token, so that a copy of the database signs nobody in. */
export const session = sqliteTable(
  'session',
  {
    id: text('id').primaryKey(),
    userId: text('user_id')
      .$type<UserId>()
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    /** Idle limit in epoch seconds, slides with use. */
    expiresAt: integer('expires_at').notNull(),
    /** Absolute limit in epoch milliseconds, never moves. */
    endsAt: integer('ends_at').notNull(),
    createdAt: integer('created_at').notNull(),
    /** What the person sees in the list of their sign-ins: browser and system family only. */
    device: text('device').notNull(),
  },
  (t) => [index('session_user').on(t.userId)],
);

/** Single-use links by e-mail. Only the SHA-256 of the token is stored. */
export const emailToken = sqliteTable(
  'email_token',
  {
    id: text('id').$type<Id<'etk'>>().primaryKey(),
    userId: text('user_id')
      .$type<UserId>()
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    kind: text('kind').$type<'verify' | 'reset' | 'change'>().notNull(),
    tokenHash: text('token_hash').notNull(),
    /** The address it proves: a later change of address voids it. */
    email: text('email').notNull(),
    expiresAt: integer('expires_at').notNull(),
    usedAt: integer('used_at'),
    createdAt: integer('created_at').notNull(),
  },
  (t) => [uniqueIndex('email_token_hash').on(t.tokenHash), index('email_token_user').on(t.userId, t.kind)],
);
