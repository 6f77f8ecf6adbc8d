import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import type { StaffRole } from '@/lib/domain/access/roles';
import type { Id, OrganisationId, UserId } from '@/lib/domain/shared/ids';
import { user } from './account';

export const organisation = sqliteTable(
  'organisation',
  {
    id: text('id').$type<OrganisationId>().primaryKey(),
    slug: text('slug').notNull(),
    name: text('name').notNull(),
    /** Shown to players as the address to write to. */
    email: text('email').notNull(),
    createdAt: integer('created_at').notNull(),
  },
  (t) => [uniqueIndex('organisation_slug').on(t.slug)],
);

/** One row a role a person holds in an organisation; a revoked row stays as history and counts for nothing. */
export const membership = sqliteTable(
  'membership',
  {
    id: text('id').$type<Id<'mbr'>>().primaryKey(),
    organisationId: text('organisation_id')
      .$type<OrganisationId>()
      .notNull()
      .references(() => organisation.id),
    userId: text('user_id')
      .$type<UserId>()
      .notNull()
      .references(() => user.id),
    role: text('role').$type<StaffRole>().notNull(),
    createdAt: integer('created_at').notNull(),
    revokedAt: integer('revoked_at'),
  },
  (t) => [
    index('membership_user').on(t.userId, t.revokedAt),
    index('membership_organisation').on(t.organisationId, t.role),
  ],
);

export const invitation = sqliteTable(
  'invitation',
  {
    id: text('id').$type<Id<'inv'>>().primaryKey(),
    organisationId: text('organisation_id')
      .$type<OrganisationId>()
      .notNull()
      .references(() => organisation.id),
    email: text('email').notNull(),
    role: text('role').$type<StaffRole>().notNull(),
    tokenHash: text('token_hash').notNull(),
    invitedBy: text('invited_by')
      .$type<UserId>()
      .notNull()
      .references(() => user.id),
    expiresAt: integer('expires_at').notNull(),
    acceptedAt: integer('accepted_at'),
    revokedAt: integer('revoked_at'),
    createdAt: integer('created_at').notNull(),
  },
  (t) => [
    uniqueIndex('invitation_token').on(t.tokenHash),
    index('invitation_organisation').on(t.organisationId),
  ],
);
