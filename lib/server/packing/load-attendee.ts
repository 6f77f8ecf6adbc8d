import 'server-only';
import { and, asc, eq, isNull } from 'drizzle-orm';
import { track } from '@/db/schema/camp';
import { order, registration, registrationHarp, registrationWorkshop, ticket } from '@/db/schema/order';
import { compareHarps } from '@/lib/domain/harp/compare-harps';
import { parseHarpId } from '@/lib/domain/harp/harp-id';
import { buildPackingList } from '@/lib/domain/packing/build-packing-list';
import type { RegistrationId } from '@/lib/domain/shared/ids';
import { clockAfter } from '@/lib/domain/shared/local-time';
import { ownMeetings } from '@/lib/domain/timetable/own-meetings';
import { loadProgramme } from '../camps/load-programme';
import { type Db, getDb, type Tx } from '../db';

/**
 * One attendee's camp: their own meetings, the harps they own and what to pack. Null when there is none. Permission is
 * the caller's to check. No money, no health data.
 */
export function loadAttendee(registrationId: RegistrationId, db: Db | Tx = getDb()) {
  const person = db
    .select({
      id: registration.id,
      orderId: registration.orderId,
      campId: registration.campId,
      trackId: registration.trackId,
      trackName: track.name,
      attendeeName: registration.attendeeName,
      attendeeEmail: registration.attendeeEmail,
      minor: registration.minor,
      state: registration.state,
      arrival: registration.arrival,
      reference: order.reference,
      payerEmail: order.payerEmail,
      ticket: { id: ticket.id, campId: ticket.campId, issuedAt: ticket.issuedAt },
    })
    .from(registration)
    .innerJoin(order, eq(order.id, registration.orderId))
    .innerJoin(track, eq(track.id, registration.trackId))
    .leftJoin(ticket, and(eq(ticket.registrationId, registration.id), isNull(ticket.revokedAt)))
    .where(eq(registration.id, registrationId))
    .get();
  const programme = person && loadProgramme(person.campId);
  if (!programme) return null;
  const electives = db
    .select({ id: registrationWorkshop.workshopId })
    .from(registrationWorkshop)
    .where(eq(registrationWorkshop.registrationId, registrationId))
    .orderBy(asc(registrationWorkshop.workshopId))
    .all()
    .map((row) => row.id);
  const owned = db
    .select({ harpId: registrationHarp.harpId })
    .from(registrationHarp)
    .where(eq(registrationHarp.registrationId, registrationId))
    .all()
    .flatMap((row) => parseHarpId(row.harpId) ?? [])
    .sort(compareHarps);
  const rooms = new Map(programme.rooms.map((room) => [room.id, room.name]));
  const meetings = ownMeetings(programme, { trackId: person.trackId, electives });
  const packing = buildPackingList({
    owned,
    meetings: meetings.map(({ id, workshop, day, starts, lengthMinutes, roomId }) => ({
      id,
      workshop: workshop.title,
      day,
      starts,
      ends: clockAfter(starts, lengthMinutes),
      room: rooms.get(roomId) ?? '',
      needs: workshop.needs,
    })),
  });
  return { person, programme, meetings, owned, packing };
}

export type Attendee = NonNullable<ReturnType<typeof loadAttendee>>;
