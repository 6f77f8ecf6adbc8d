import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { CampId, RegistrationId, UserId } from '@/lib/domain/shared/ids';
import { user } from './account';
import { camp } from './camp';
import { registration } from './order';

/** Every scan and every undo, refused ones too; append-only. */
export const scan = sqliteTable(
  'scan',
  {
    /** A UUID made on the device: sending it twice changes nothing. */
    id: text('id').primaryKey(),
    campId: text('camp_id')
      .$type<CampId>()
      .notNull()
      .references(() => camp.id),
    registrationId: text('registration_id')
      .$type<RegistrationId>()
      .references(() => registration.id),
    kind: text('kind').$type<'arrive' | 'undo'>().notNull(),
    source: text('source').$type<'camera' | 'name'>().notNull(),
    verdict: text('verdict').notNull(),
    /** Why it was undone; empty otherwise. */
    reason: text('reason').notNull().default(''),
    byUserId: text('by_user_id')
      .$type<UserId>()
      .notNull()
      .references(() => user.id),
    /** The phone's clock, for the record only; the server's decides. */
    deviceAt: integer('device_at').notNull(),
    receivedAt: integer('received_at').notNull(),
  },
  (t) => [
    index('scan_camp').on(t.campId, t.receivedAt),
    index('scan_registration').on(t.registrationId, t.receivedAt),
  ],
);
