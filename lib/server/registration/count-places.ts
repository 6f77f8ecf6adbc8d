import 'server-only';
import { and, count, eq, inArray, min, sql } from 'drizzle-orm';
import { camp, room, track } from '@/db/schema/camp';
import { registration, registrationWorkshop } from '@/db/schema/order';
import { meeting, workshop } from '@/db/schema/workshop';
import type { CampPlaces, Places } from '@/lib/domain/camp/places';
import { SEATED_STATES } from '@/lib/domain/registration/states';
import type { CampId } from '@/lib/domain/shared/ids';
import { preparedOnce } from '../db';

const places = (capacity: number, taken: number): Places => ({
  capacity,
  taken,
  left: Math.max(0, capacity - taken),
});

const queries = preparedOnce((db) => {
  const campId = sql.placeholder('campId');
  const seated = and(eq(registration.campId, campId), inArray(registration.state, [...SEATED_STATES]));
  return {
    capacity: db.select({ capacity: camp.capacity }).from(camp).where(eq(camp.id, campId)).prepare(),
    takenByTrack: db
      .select({ id: registration.trackId, taken: count() })
      .from(registration)
      .where(seated)
      .groupBy(registration.trackId)
      .prepare(),
    takenByWorkshop: db
      .select({ id: registrationWorkshop.workshopId, taken: count() })
      .from(registrationWorkshop)
      .innerJoin(registration, eq(registration.id, registrationWorkshop.registrationId))
      .where(seated)
      .groupBy(registrationWorkshop.workshopId)
      .prepare(),
    tracks: db
      .select({ id: track.id, capacity: track.capacity })
      .from(track)
      .where(eq(track.campId, campId))
      .prepare(),
    // Without a limit of its own an elective takes as many as the smallest room it meets in seats.
    electives: db
      .select({ id: workshop.id, capacity: workshop.capacity, seats: min(room.seats) })
      .from(workshop)
      .leftJoin(meeting, eq(meeting.workshopId, workshop.id))
      .leftJoin(room, eq(room.id, meeting.roomId))
      .where(and(eq(workshop.campId, campId), eq(workshop.audience, 'elective')))
      .groupBy(workshop.id)
      .prepare(),
  };
});

/**
 * Places by counting rows: there is no counter that could disagree with them. Read it inside the transaction that
 * takes a place; five statements whatever the size. Null when there is no such camp.
 */
export function countPlaces(campId: CampId): CampPlaces | null {
  const of = { campId };
  const query = queries();
  const head = query.capacity.get(of);
  if (!head) return null;
  const byTrack = new Map(query.takenByTrack.all(of).map((row) => [row.id, row.taken]));
  const byWorkshop = new Map(query.takenByWorkshop.all(of).map((row) => [row.id, row.taken]));
  return {
    camp: places(
      head.capacity,
      [...byTrack.values()].reduce((sum, taken) => sum + taken, 0),
    ),
    tracks: query.tracks
      .all(of)
      .map(({ id, capacity }) => ({ id, places: places(capacity, byTrack.get(id) ?? 0) })),
    electives: query.electives.all(of).flatMap(({ id, capacity, seats }) => {
      const limit = capacity ?? seats;
      return limit === null ? [] : [{ id, places: places(limit, byWorkshop.get(id) ?? 0) }];
    }),
  };
}
