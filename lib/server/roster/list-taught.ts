import 'server-only';
import { and, asc, eq } from 'drizzle-orm';
import { track } from '@/db/schema/camp';
import { registration, registrationHarp, registrationWorkshop } from '@/db/schema/order';
import { meets, namedNeeds, type RosterPlayer, type TaughtMeeting } from '@/lib/domain/roster/taught-meeting';
import type { CampId, InstructorId, RegistrationId, TrackId, WorkshopId } from '@/lib/domain/shared/ids';
import { takesPart } from '@/lib/domain/timetable/own-meetings';
import type { Programme } from '@/lib/domain/timetable/programme';
import { AUDIENCE_WORDS } from '@/lib/domain/timetable/workshop-words';
import { getDb } from '../db';

type Player = { id: RegistrationId; name: string; track: string; trackId: TrackId };

/**
 * An instructor's meetings in order of time, each with the confirmed players who take part and which of its harps they
 * own. Three statements besides the programme's own, whatever the size. Names, tracks and harps only.
 */
export function listTaught(programme: Programme, instructorId: InstructorId): TaughtMeeting[] {
  const taught = new Map(
    programme.workshops
      .filter((workshop) => workshop.instructorIds.includes(instructorId))
      .map((workshop) => [workshop.id, workshop]),
  );
  const { players, electives, harps } = readPlayers(programme.camp.id);
  return programme.meetings.flatMap((meeting): TaughtMeeting[] => {
    const workshop = taught.get(meeting.workshopId);
    if (!workshop) return [];
    const { day, starts, lengthMinutes, id } = meeting;
    const room = programme.rooms.find((one) => one.id === meeting.roomId);
    const coming = players.filter((player) =>
      takesPart(workshop, { trackId: player.trackId, electives: electives.get(player.id) ?? [] }),
    );
    const named = namedNeeds(workshop.needs);
    const toRoster = ({ id: playerId, name, track: inTrack }: Player): RosterPlayer => ({
      id: playerId,
      name,
      track: inTrack,
      has: meets(named, harps.get(playerId) ?? new Set()),
    });
    const tracks = programme.tracks.filter((one) => workshop.trackIds.includes(one.id));
    return [
      {
        id,
        title: workshop.title,
        kind: workshop.kind,
        day,
        starts,
        lengthMinutes,
        room: room?.name ?? '',
        kit: room?.kit ?? '',
        whose:
          workshop.audience === 'core'
            ? tracks.map(({ name }) => name).join(', ')
            : AUDIENCE_WORDS[workshop.audience],
        with: programme.instructors
          .filter((one) => one.id !== instructorId && workshop.instructorIds.includes(one.id))
          .map(({ name }) => name),
        needs: workshop.needs,
        count: coming.length,
        players: workshop.audience === 'everyone' ? [] : coming.map(toRoster),
      },
    ];
  });
}

function readPlayers(campId: CampId) {
  const db = getDb();
  const confirmed = and(eq(registration.campId, campId), eq(registration.state, 'confirmed'));
  const players: Player[] = db
    .select({
      id: registration.id,
      name: registration.attendeeName,
      track: track.name,
      trackId: registration.trackId,
    })
    .from(registration)
    .innerJoin(track, eq(track.id, registration.trackId))
    .where(confirmed)
    .orderBy(asc(registration.attendeeSearch), asc(registration.id))
    .all();
  const electives = new Map<RegistrationId, WorkshopId[]>();
  for (const row of db
    .select({ id: registrationWorkshop.registrationId, workshopId: registrationWorkshop.workshopId })
    .from(registrationWorkshop)
    .innerJoin(registration, eq(registration.id, registrationWorkshop.registrationId))
    .where(confirmed)
    .all())
    electives.set(row.id, [...(electives.get(row.id) ?? []), row.workshopId]);
  const harps = new Map<RegistrationId, Set<string>>();
  for (const row of db
    .select({ id: registrationHarp.registrationId, harpId: registrationHarp.harpId })
    .from(registrationHarp)
    .innerJoin(registration, eq(registration.id, registrationHarp.registrationId))
    .where(confirmed)
    .all())
    harps.set(row.id, (harps.get(row.id) ?? new Set()).add(row.harpId));
  return { players, electives, harps };
}
