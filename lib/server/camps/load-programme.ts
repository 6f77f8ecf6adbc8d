import 'server-only';
import { asc, eq, sql } from 'drizzle-orm';
import { block, camp, campPicture, instructor, room, track } from '@/db/schema/camp';
import { organisation } from '@/db/schema/organisation';
import { harpNeed, meeting, workshop, workshopInstructor, workshopTrack } from '@/db/schema/workshop';
import type { CampId, WorkshopId } from '@/lib/domain/shared/ids';
import type { Programme } from '@/lib/domain/timetable/programme';
import { preparedOnce } from '../db';

const queries = preparedOnce((db) => {
  const campId = sql.placeholder('campId');
  const inCamp = eq(workshop.campId, campId);
  return {
    head: db
      .select({ camp, organisationName: organisation.name, organisationEmail: organisation.email })
      .from(camp)
      .innerJoin(organisation, eq(organisation.id, camp.organisationId))
      .where(eq(camp.id, campId))
      .prepare(),
    workshops: db
      .select()
      .from(workshop)
      .where(inCamp)
      .orderBy(asc(workshop.title), asc(workshop.id))
      .prepare(),
    tracksOf: db
      .select({ workshopId: workshopTrack.workshopId, trackId: workshopTrack.trackId })
      .from(workshopTrack)
      .innerJoin(workshop, eq(workshop.id, workshopTrack.workshopId))
      .where(inCamp)
      .orderBy(asc(workshopTrack.trackId))
      .prepare(),
    instructorsOf: db
      .select({ workshopId: workshopInstructor.workshopId, instructorId: workshopInstructor.instructorId })
      .from(workshopInstructor)
      .innerJoin(workshop, eq(workshop.id, workshopInstructor.workshopId))
      .where(inCamp)
      .orderBy(asc(workshopInstructor.instructorId))
      .prepare(),
    needsOf: db
      .select({
        workshopId: harpNeed.workshopId,
        level: harpNeed.level,
        anyOf: harpNeed.anyOf,
        note: harpNeed.note,
      })
      .from(harpNeed)
      .innerJoin(workshop, eq(workshop.id, harpNeed.workshopId))
      .where(inCamp)
      .orderBy(asc(harpNeed.position), asc(harpNeed.id))
      .prepare(),
    tracks: db
      .select()
      .from(track)
      .where(eq(track.campId, campId))
      .orderBy(asc(track.position), asc(track.id))
      .prepare(),
    rooms: db
      .select()
      .from(room)
      .where(eq(room.campId, campId))
      .orderBy(asc(room.position), asc(room.id))
      .prepare(),
    instructors: db
      .select({ id: instructor.id, name: instructor.name, bio: instructor.bio })
      .from(instructor)
      .where(eq(instructor.campId, campId))
      .orderBy(asc(instructor.position), asc(instructor.id))
      .prepare(),
    meetings: db
      .select()
      .from(meeting)
      .where(eq(meeting.campId, campId))
      .orderBy(asc(meeting.day), asc(meeting.starts), asc(meeting.id))
      .prepare(),
    blocks: db.select().from(block).where(eq(block.campId, campId)).orderBy(asc(block.starts)).prepare(),
    pictures: db
      .select({
        id: campPicture.id,
        alt: campPicture.alt,
        width: campPicture.width,
        height: campPicture.height,
      })
      .from(campPicture)
      .where(eq(campPicture.campId, campId))
      .orderBy(asc(campPicture.position), asc(campPicture.id))
      .prepare(),
  };
});

/**
 * A camp's whole programme in eleven statements, whatever its size; null when there is no such camp.
 * Says nothing of who may see it: callers check the state (public) or a permission (staff) first.
 */
export function loadProgramme(campId: CampId): Programme | null {
  const of = { campId };
  const query = queries();
  const head = query.head.get(of);
  if (!head) return null;
  const tracksBy = byWorkshop(query.tracksOf.all(of));
  const instructorsBy = byWorkshop(query.instructorsOf.all(of));
  const needsBy = byWorkshop(query.needsOf.all(of));
  return {
    camp: {
      ...head.camp,
      organisationName: head.organisationName,
      organisationEmail: head.organisationEmail,
    },
    tracks: query.tracks.all(of),
    rooms: query.rooms.all(of),
    instructors: query.instructors.all(of),
    workshops: query.workshops.all(of).map((row) => ({
      ...row,
      trackIds: tracksBy(row.id).map((one) => one.trackId),
      instructorIds: instructorsBy(row.id).map((one) => one.instructorId),
      needs: needsBy(row.id).map(({ level, anyOf, note }) => ({ level, anyOf, ...(note && { note }) })),
    })),
    meetings: query.meetings.all(of),
    blocks: query.blocks.all(of),
    pictures: query.pictures.all(of),
  };
}

/** The rows of a workshop, in the order they came, without a search through all of them for each workshop. */
function byWorkshop<Row extends { workshopId: WorkshopId }>(rows: readonly Row[]) {
  const by = new Map<WorkshopId, Row[]>();
  for (const row of rows) {
    const own = by.get(row.workshopId);
    if (own) own.push(row);
    else by.set(row.workshopId, [row]);
  }
  return (id: WorkshopId): readonly Row[] => by.get(id) ?? [];
}
