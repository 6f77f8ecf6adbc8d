import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { CampId, Id, OrganisationId, UserId } from '@/lib/domain/shared/ids';

/** Who changed what, for people: a sentence without health data or secrets. */
export const audit = sqliteTable(
  'audit',
  {
    id: text('id').$type<Id<'aud'>>().primaryKey(),
    organisationId: text('organisation_id').$type<OrganisationId>(),
    campId: text('camp_id').$type<CampId>(),
    /** Null when the system did it. */
    actorUserId: text('actor_user_id').$type<UserId>(),
    action: text('action').notNull(),
    subjectId: text('subject_id').notNull(),
    sentence: text('sentence').notNull(),
    at: integer('at').notNull(),
  },
  (t) => [index('audit_camp').on(t.campId, t.at), index('audit_organisation').on(t.organisationId, t.at)],
);
