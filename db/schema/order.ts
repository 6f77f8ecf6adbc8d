import { sql } from 'drizzle-orm';
import { index, integer, primaryKey, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import type { ArrivalState } from '@/lib/domain/door/arrival-states';
import type { RegistrationState } from '@/lib/domain/registration/states';
import type {
  CampId,
  Id,
  OrderId,
  OrganisationId,
  RegistrationId,
  TicketId,
  TrackId,
  UserId,
  WorkshopId,
} from '@/lib/domain/shared/ids';
import type { Minor } from '@/lib/domain/shared/money';
import { user } from './account';
import { camp, track } from './camp';
import { organisation } from './organisation';
import { workshop } from './workshop';

/** Answers given so far on the way to an order; found by the SHA-256 of a token in the browser's cookie. */
export const draft = sqliteTable(
  'draft',
  {
    id: text('id').$type<Id<'dft'>>().primaryKey(),
    tokenHash: text('token_hash').notNull(),
    campId: text('camp_id')
      .$type<CampId>()
      .notNull()
      .references(() => camp.id),
    /** One key a step; each value has passed that step's schema. Emptied when the order is made. */
    answers: text('answers', { mode: 'json' }).$type<Record<string, unknown>>().notNull(),
    /** The order it became; a second press of "pay" finds it instead of making another. */
    orderId: text('order_id').$type<OrderId>(),
    createdAt: integer('created_at').notNull(),
    updatedAt: integer('updated_at').notNull(),
  },
  (t) => [uniqueIndex('draft_token').on(t.tokenHash, t.campId), index('draft_updated').on(t.updatedAt)],
);

/** What a payer owes and has paid; one or more registrations. */
export const order = sqliteTable(
  'order',
  {
    id: text('id').$type<OrderId>().primaryKey(),
    organisationId: text('organisation_id')
      .$type<OrganisationId>()
      .notNull()
      .references(() => organisation.id),
    campId: text('camp_id')
      .$type<CampId>()
      .notNull()
      .references(() => camp.id),
    /** Said on the phone and printed on receipts: eight characters without look-alikes. */
    reference: text('reference').notNull(),
    state: text('state').$type<RegistrationState>().notNull(),
    payerUserId: text('payer_user_id')
      .$type<UserId>()
      .references(() => user.id),
    payerName: text('payer_name').notNull(),
    payerEmail: text('payer_email').notNull(),
    currency: text('currency').notNull(),
    total: integer('total').$type<Minor>().notNull(),
    /** The refund terms as they stood when it was made. */
    refundTerms: text('refund_terms').notNull(),
    /** Epoch ms until which its places are reserved; null once confirmed. */
    heldUntil: integer('held_until'),
    confirmedAt: integer('confirmed_at'),
    createdAt: integer('created_at').notNull(),
    updatedAt: integer('updated_at').notNull(),
  },
  (t) => [
    uniqueIndex('order_reference').on(t.reference),
    index('order_camp').on(t.campId, t.state),
    index('order_payer').on(t.payerUserId),
    index('order_payer_email').on(t.payerEmail),
    index('order_held').on(t.state, t.heldUntil),
  ],
);

export const orderLine = sqliteTable(
  'order_line',
  {
    id: text('id').$type<Id<'lin'>>().primaryKey(),
    orderId: text('order_id')
      .$type<OrderId>()
      .notNull()
      .references(() => order.id),
    registrationId: text('registration_id').$type<RegistrationId>(),
    label: text('label').notNull(),
    quantity: integer('quantity').notNull(),
    unit: integer('unit').$type<Minor>().notNull(),
    amount: integer('amount').$type<Minor>().notNull(),
    position: integer('position').notNull(),
  },
  (t) => [index('order_line_order').on(t.orderId, t.position)],
);

/** One attendee at one camp. */
export const registration = sqliteTable(
  'registration',
  {
    id: text('id').$type<RegistrationId>().primaryKey(),
    orderId: text('order_id')
      .$type<OrderId>()
      .notNull()
      .references(() => order.id),
    campId: text('camp_id')
      .$type<CampId>()
      .notNull()
      .references(() => camp.id),
    trackId: text('track_id')
      .$type<TrackId>()
      .notNull()
      .references(() => track.id),
    attendeeUserId: text('attendee_user_id')
      .$type<UserId>()
      .references(() => user.id),
    attendeeName: text('attendee_name').notNull(),
    /** Name folded for search: no accents, lower case. */
    attendeeSearch: text('attendee_search').notNull(),
    attendeeEmail: text('attendee_email').notNull(),
    minor: integer('minor', { mode: 'boolean' }).notNull(),
    state: text('state').$type<RegistrationState>().notNull(),
    arrival: text('arrival').$type<ArrivalState>().notNull().default('expected'),
    arrivedAt: integer('arrived_at'),
    createdAt: integer('created_at').notNull(),
    updatedAt: integer('updated_at').notNull(),
  },
  (t) => [
    index('registration_camp').on(t.campId, t.state),
    index('registration_track').on(t.trackId, t.state),
    index('registration_order').on(t.orderId),
    index('registration_search').on(t.campId, t.attendeeSearch),
    index('registration_attendee').on(t.attendeeUserId),
    index('registration_attendee_email').on(t.attendeeEmail),
  ],
);

/** Health, safety and contact details, apart from the registration so that no list reads them by accident. */
export const registrationNeeds = sqliteTable('registration_needs', {
  registrationId: text('registration_id')
    .$type<RegistrationId>()
    .primaryKey()
    .references(() => registration.id),
  diet: text('diet').notNull().default(''),
  access: text('access').notNull().default(''),
  emergencyName: text('emergency_name').notNull().default(''),
  /** E.164. */
  emergencyPhone: text('emergency_phone').notNull().default(''),
  guardianName: text('guardian_name').notNull().default(''),
  guardianEmail: text('guardian_email').notNull().default(''),
  guardianPhone: text('guardian_phone').notNull().default(''),
  /** When a guardian agreed, and to which wording; null for adults and until they do. */
  consentAt: integer('consent_at'),
  consentText: text('consent_text').notNull().default(''),
});

/** Electives taken; a row of a seated registration uses one seat of the workshop. */
export const registrationWorkshop = sqliteTable(
  'registration_workshop',
  {
    registrationId: text('registration_id')
      .$type<RegistrationId>()
      .notNull()
      .references(() => registration.id),
    workshopId: text('workshop_id')
      .$type<WorkshopId>()
      .notNull()
      .references(() => workshop.id),
  },
  (t) => [
    primaryKey({ columns: [t.registrationId, t.workshopId] }),
    index('registration_workshop_workshop').on(t.workshopId),
  ],
);

/** Harps an attendee owns, as canonical harp ids (see lib/domain/harp). */
export const registrationHarp = sqliteTable(
  'registration_harp',
  {
    registrationId: text('registration_id')
      .$type<RegistrationId>()
      .notNull()
      .references(() => registration.id),
    harpId: text('harp_id').notNull(),
  },
  (t) => [primaryKey({ columns: [t.registrationId, t.harpId] })],
);

/** One valid ticket a confirmed registration. The QR's text is signed anew from these fields; nothing secret is stored. */
export const ticket = sqliteTable(
  'ticket',
  {
    id: text('id').$type<TicketId>().primaryKey(),
    registrationId: text('registration_id')
      .$type<RegistrationId>()
      .notNull()
      .references(() => registration.id),
    campId: text('camp_id')
      .$type<CampId>()
      .notNull()
      .references(() => camp.id),
    issuedAt: integer('issued_at').notNull(),
    revokedAt: integer('revoked_at'),
  },
  (t) => [
    uniqueIndex('ticket_valid').on(t.registrationId).where(sql`revoked_at is null`),
    index('ticket_camp').on(t.campId),
  ],
);
