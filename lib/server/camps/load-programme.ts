import 'server-only';
import { asc, eq } from 'drizzle-orm';
import { block, camp, campPicture, instructor, room, track } from '@/db/schema/camp';
import { organisation } from '@/db/schema/organisation';
import { harpNeed, meeting, workshop, workshopInstructor, workshopTrack } from '@/db/schema/workshop';
import type { CampId, WorkshopId } from '@/lib/domain/shared/ids';
import type { Programme } from '@/lib/domain/timetable/programme';
import { type Db, getDb, type Tx } from '../db';

/**
 * A camp's whole programme in eleven statements, whatever its size; null when there is no such camp.
 * Says nothing of who may see it: callers check the state (public) or a permission (staff) first.
 */
export function loadProgramme(campId: CampId, db: Db | Tx = getDb()): Programme | null {
  const head = db
    .select({ camp, organisationName: organisation.name, organisationEmail: organisation.email })
    .from(camp)
    .innerJoin(organisation, eq(organisation.id, camp.organisationId))
    .where(eq(camp.id, campId))
    .get();
  if (!head) return null;
  const inCamp = eq(workshop.campId, campId);
  const workshops = db
    .select()
    .from(workshop)
    .where(inCamp)
    .orderBy(asc(workshop.title), asc(workshop.id))
    .all();
  const tracksOf = db
    .select({ workshopId: workshopTrack.workshopId, trackId: workshopTrack.trackId })
    .from(workshopTrack)
    .innerJoin(workshop, eq(workshop.id, workshopTrack.workshopId))
    .where(inCamp)
    .orderBy(asc(workshopTrack.trackId))
    .all();
  const instructorsOf = db
    .select({ workshopId: workshopInstructor.workshopId, instructorId: workshopInstructor.instructorId })
    .from(workshopInstructor)
    .innerJoin(workshop, eq(workshop.id, workshopInstructor.workshopId))
    .where(inCamp)
    .orderBy(asc(workshopInstructor.instructorId))
    .all();
  const needsOf = db
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
    .all();
  const tracksBy = byWorkshop(tracksOf);
  const instructorsBy = byWorkshop(instructorsOf);
  const needsBy = byWorkshop(needsOf);

  return {
    camp: {
      ...head.camp,
      organisationName: head.organisationName,
      organisationEmail: head.organisationEmail,
    },
    tracks: db
      .select()
      .from(track)
      .where(eq(track.campId, campId))
      .orderBy(asc(track.position), asc(track.id))
      .all(),
    rooms: db
      .select()
      .from(room)
      .where(eq(room.campId, campId))
      .orderBy(asc(room.position), asc(room.id))
      .all(),
    instructors: db
      .select({ id: instructor.id, name: instructor.name, bio: instructor.bio })
      .from(instructor)
      .where(eq(instructor.campId, campId))
      .orderBy(asc(instructor.position), asc(instructor.id))
      .all(),
    workshops: workshops.map((row) => ({
      ...row,
      trackIds: tracksBy(row.id).map((of) => of.trackId),
      instructorIds: instructorsBy(row.id).map((of) => of.instructorId),
      needs: needsBy(row.id).map(({ level, anyOf, note }) => ({ level, anyOf, ...(note && { note }) })),
    })),
    meetings: db
      .select()
      .from(meeting)
      .where(eq(meeting.campId, campId))
      .orderBy(asc(meeting.day), asc(meeting.starts), asc(meeting.id))
      .all(),
    blocks: db.select().from(block).where(eq(block.campId, campId)).orderBy(asc(block.starts)).all(),
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
      .all(),
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
