import { index, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { HarpAsk } from '@/lib/domain/harp/harp-ask';
import type {
  CampId,
  Id,
  InstructorId,
  MeetingId,
  RoomId,
  TrackId,
  WorkshopId,
} from '@/lib/domain/shared/ids';
import type { WorkshopAudience, WorkshopKind } from '@/lib/domain/timetable/workshop-words';
import { camp, instructor, room, track } from './camp';

export const workshop = sqliteTable(
  'workshop',
  {
    id: text('id').$type<WorkshopId>().primaryKey(),
    campId: text('camp_id')
      .$type<CampId>()
      .notNull()
      .references(() => camp.id),
    title: text('title').notNull(),
    description: text('description').notNull().default(''),
    kind: text('kind').$type<WorkshopKind>().notNull(),
    audience: text('audience').$type<WorkshopAudience>().notNull(),
    lengthMinutes: integer('length_minutes').notNull(),
    /** People at most; null is as many as the room seats. */
    capacity: integer('capacity'),
  },
  (t) => [index('workshop_camp').on(t.campId)],
);

export const workshopTrack = sqliteTable(
  'workshop_track',
  {
    workshopId: text('workshop_id')
      .$type<WorkshopId>()
      .notNull()
      .references(() => workshop.id, { onDelete: 'cascade' }),
    trackId: text('track_id')
      .$type<TrackId>()
      .notNull()
      .references(() => track.id),
  },
  (t) => [primaryKey({ columns: [t.workshopId, t.trackId] }), index('workshop_track_track').on(t.trackId)],
);

export const workshopInstructor = sqliteTable(
  'workshop_instructor',
  {
    workshopId: text('workshop_id')
      .$type<WorkshopId>()
      .notNull()
      .references(() => workshop.id, { onDelete: 'cascade' }),
    instructorId: text('instructor_id')
      .$type<InstructorId>()
      .notNull()
      .references(() => instructor.id),
  },
  (t) => [
    primaryKey({ columns: [t.workshopId, t.instructorId] }),
    index('workshop_instructor_instructor').on(t.instructorId),
  ],
);

/** One thing to bring: any one of the alternatives will do. */
export const harpNeed = sqliteTable(
  'harp_need',
  {
    id: text('id').$type<Id<'need'>>().primaryKey(),
    workshopId: text('workshop_id')
      .$type<WorkshopId>()
      .notNull()
      .references(() => workshop.id, { onDelete: 'cascade' }),
    level: text('level').$type<'required' | 'helpful'>().notNull(),
    anyOf: text('any_of', { mode: 'json' }).$type<HarpAsk[]>().notNull(),
    note: text('note').notNull().default(''),
    position: integer('position').notNull(),
  },
  (t) => [index('harp_need_workshop').on(t.workshopId, t.position)],
);

/** A workshop at a time in a room. Wall time in the camp's zone, so that it stays put when clock rules change. */
export const meeting = sqliteTable(
  'meeting',
  {
    id: text('id').$type<MeetingId>().primaryKey(),
    campId: text('camp_id')
      .$type<CampId>()
      .notNull()
      .references(() => camp.id),
    workshopId: text('workshop_id')
      .$type<WorkshopId>()
      .notNull()
      .references(() => workshop.id),
    roomId: text('room_id')
      .$type<RoomId>()
      .notNull()
      .references(() => room.id),
    /** ISO date of the day it starts on. */
    day: text('day').notNull(),
    /** HH:MM. */
    starts: text('starts').notNull(),
    lengthMinutes: integer('length_minutes').notNull(),
    /** iCalendar SEQUENCE: one up with each change of time or room. */
    sequence: integer('sequence').notNull().default(0),
    updatedAt: integer('updated_at').notNull(),
  },
  (t) => [
    index('meeting_camp').on(t.campId, t.day, t.starts),
    index('meeting_workshop').on(t.workshopId),
    index('meeting_room').on(t.roomId, t.day),
  ],
);
