import {
  type AnySQLiteColumn,
  index,
  integer,
  sqliteTable,
  text,
  uniqueIndex,
} from 'drizzle-orm/sqlite-core';
import type { CampState, RoomLoudness, TrackLevel } from '@/lib/domain/camp/camp-words';
import type {
  CampId,
  Id,
  InstructorId,
  OrganisationId,
  RoomId,
  TrackId,
  UserId,
} from '@/lib/domain/shared/ids';
import type { Minor } from '@/lib/domain/shared/money';
import { user } from './account';
import { organisation } from './organisation';

export const camp = sqliteTable(
  'camp',
  {
    id: text('id').$type<CampId>().primaryKey(),
    organisationId: text('organisation_id')
      .$type<OrganisationId>()
      .notNull()
      .references(() => organisation.id),
    /** In the public address; unique over all organisations. */
    slug: text('slug').notNull(),
    name: text('name').notNull(),
    /** One sentence for lists and shared links. */
    summary: text('summary').notNull().default(''),
    /** Plain text; blank lines part paragraphs. */
    description: text('description').notNull().default(''),
    /** ISO dates in the camp's own zone; the last day is included. */
    startsOn: text('starts_on').notNull(),
    endsOn: text('ends_on').notNull(),
    /** IANA name, such as Europe/Berlin. */
    timeZone: text('time_zone').notNull(),
    /** ISO 4217. Fixed once an order exists. */
    currency: text('currency').notNull(),
    venueName: text('venue_name').notNull().default(''),
    venueAddress: text('venue_address').notNull().default(''),
    /** Places in all. 0 sells nothing. */
    capacity: integer('capacity').notNull(),
    /** Price of a place unless the track names its own; null while undecided (blocks publishing). */
    price: integer('price').$type<Minor>(),
    /** In words, shown before paying and stored with each order. */
    refundTerms: text('refund_terms').notNull().default(''),
    /** Local wall time at which the door opens on the first day, HH:MM. */
    arrivalFrom: text('arrival_from').notNull().default('14:00'),
    state: text('state').$type<CampState>().notNull().default('draft'),
    publishedAt: integer('published_at'),
    closedAt: integer('closed_at'),
    copiedFrom: text('copied_from')
      .$type<CampId>()
      .references((): AnySQLiteColumn => camp.id),
    /** Goes up by one with each edit of the camp's own row: a stale form is refused, not merged. */
    version: integer('version').notNull().default(1),
    createdAt: integer('created_at').notNull(),
    updatedAt: integer('updated_at').notNull(),
  },
  (t) => [
    uniqueIndex('camp_slug').on(t.slug),
    index('camp_organisation').on(t.organisationId),
    index('camp_public').on(t.state, t.startsOn),
  ],
);

/** Re-encoded to WebP at upload; the file lies under the data folder as `pictures/{id}.webp`. */
export const campPicture = sqliteTable(
  'camp_picture',
  {
    id: text('id').$type<Id<'pic'>>().primaryKey(),
    campId: text('camp_id')
      .$type<CampId>()
      .notNull()
      .references(() => camp.id),
    /** Read aloud in its place; never empty. */
    alt: text('alt').notNull(),
    width: integer('width').notNull(),
    height: integer('height').notNull(),
    position: integer('position').notNull(),
    createdAt: integer('created_at').notNull(),
  },
  (t) => [index('camp_picture_camp').on(t.campId, t.position)],
);

export const track = sqliteTable(
  'track',
  {
    id: text('id').$type<TrackId>().primaryKey(),
    campId: text('camp_id')
      .$type<CampId>()
      .notNull()
      .references(() => camp.id),
    name: text('name').notNull(),
    level: text('level').$type<TrackLevel>().notNull(),
    /** What a player must already be able to do, in plain words. */
    gate: text('gate').notNull().default(''),
    capacity: integer('capacity').notNull(),
    /** Null takes the camp's price. */
    price: integer('price').$type<Minor>(),
    position: integer('position').notNull(),
  },
  (t) => [index('track_camp').on(t.campId, t.position)],
);

export const room = sqliteTable(
  'room',
  {
    id: text('id').$type<RoomId>().primaryKey(),
    campId: text('camp_id')
      .$type<CampId>()
      .notNull()
      .references(() => camp.id),
    name: text('name').notNull(),
    seats: integer('seats').notNull(),
    loudness: text('loudness').$type<RoomLoudness>().notNull(),
    /** Free words: piano, PA, screen, sink. */
    kit: text('kit').notNull().default(''),
    position: integer('position').notNull(),
  },
  (t) => [index('room_camp').on(t.campId, t.position)],
);

export const instructor = sqliteTable(
  'instructor',
  {
    id: text('id').$type<InstructorId>().primaryKey(),
    campId: text('camp_id')
      .$type<CampId>()
      .notNull()
      .references(() => camp.id),
    /** The account that sees this instructor's own meetings; null until linked. */
    userId: text('user_id')
      .$type<UserId>()
      .references(() => user.id),
    name: text('name').notNull(),
    bio: text('bio').notNull().default(''),
    position: integer('position').notNull(),
  },
  (t) => [index('instructor_camp').on(t.campId, t.position), index('instructor_user').on(t.userId)],
);

/** A row of the timetable grid: the same times on every day. `ends` before `starts` runs past midnight. */
export const block = sqliteTable(
  'block',
  {
    id: text('id').$type<Id<'blk'>>().primaryKey(),
    campId: text('camp_id')
      .$type<CampId>()
      .notNull()
      .references(() => camp.id),
    /** HH:MM, local wall time. */
    starts: text('starts').notNull(),
    ends: text('ends').notNull(),
    label: text('label').notNull().default(''),
  },
  (t) => [index('block_camp').on(t.campId, t.starts)],
);
