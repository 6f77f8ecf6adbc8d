import 'server-only';
import { and, count, eq, inArray, min } from 'drizzle-orm';
import { camp, room, track } from '@/db/schema/camp';
import { registration, registrationWorkshop } from '@/db/schema/order';
import { meeting, workshop } from '@/db/schema/workshop';
import type { CampPlaces, Places } from '@/lib/domain/camp/places';
import { SEATED_STATES } from '@/lib/domain/registration/states';
import type { CampId } from '@/lib/domain/shared/ids';
import { type Db, getDb, type Tx } from '../db';

const places = (capacity: number, taken: number): Places => ({
  capacity,
  taken,
  left: Math.max(0, capacity - taken),
});

/**
 * Places by counting rows: there is no counter that could disagree with them. Read it inside the transaction that
 * takes a place; five statements whatever the size. Null when there is no such camp.
 */
export function countPlaces(campId: CampId, db: Db | Tx = getDb()): CampPlaces | null {
  const head = db.select({ capacity: camp.capacity }).from(camp).where(eq(camp.id, campId)).get();
  if (!head) return null;
  const seated = and(eq(registration.campId, campId), inArray(registration.state, [...SEATED_STATES]));
  const byTrack = new Map(
    db
      .select({ id: registration.trackId, taken: count() })
      .from(registration)
      .where(seated)
      .groupBy(registration.trackId)
      .all()
      .map((row) => [row.id, row.taken]),
  );
  const byWorkshop = new Map(
    db
      .select({ id: registrationWorkshop.workshopId, taken: count() })
      .from(registrationWorkshop)
      .innerJoin(registration, eq(registration.id, registrationWorkshop.registrationId))
      .where(seated)
      .groupBy(registrationWorkshop.workshopId)
      .all()
      .map((row) => [row.id, row.taken]),
  );
  const tracks = db
    .select({ id: track.id, capacity: track.capacity })
    .from(track)
    .where(eq(track.campId, campId))
    .all();
  // Without a limit of its own an elective takes as many as the smallest room it meets in seats.
  const electives = db
    .select({ id: workshop.id, capacity: workshop.capacity, seats: min(room.seats) })
    .from(workshop)
    .leftJoin(meeting, eq(meeting.workshopId, workshop.id))
    .leftJoin(room, eq(room.id, meeting.roomId))
    .where(and(eq(workshop.campId, campId), eq(workshop.audience, 'elective')))
    .groupBy(workshop.id)
    .all();
  return {
    camp: places(
      head.capacity,
      [...byTrack.values()].reduce((sum, taken) => sum + taken, 0),
    ),
    tracks: tracks.map(({ id, capacity }) => ({ id, places: places(capacity, byTrack.get(id) ?? 0) })),
    electives: electives.flatMap(({ id, capacity, seats }) => {
      const limit = capacity ?? seats;
      return limit === null ? [] : [{ id, places: places(limit, byWorkshop.get(id) ?? 0) }];
    }),
  };
}
