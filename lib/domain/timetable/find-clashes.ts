import { compareText } from '../shared/compare-text';
import { localInterval } from '../shared/local-time';
import type { Clash } from './clash';
import { expectedPeople } from './expected-people';
import { KIND_LOUDNESS, tooLoudFor } from './kind-loudness';
import type { Programme, ProgrammeMeeting, ProgrammeRoom, ProgrammeWorkshop } from './programme';

export type ClashInput = {
  camp: Pick<Programme['camp'], 'startsOn' | 'endsOn' | 'timeZone' | 'capacity'>;
  tracks: readonly Pick<Programme['tracks'][number], 'id' | 'capacity'>[];
  rooms: readonly Pick<ProgrammeRoom, 'id' | 'seats' | 'loudness'>[];
  workshops: readonly Pick<
    ProgrammeWorkshop,
    'id' | 'kind' | 'audience' | 'capacity' | 'trackIds' | 'instructorIds'
  >[];
  meetings: readonly Pick<
    ProgrammeMeeting,
    'id' | 'workshopId' | 'roomId' | 'day' | 'starts' | 'lengthMinutes'
  >[];
};
type Timed = ClashInput['meetings'][number] & {
  from: number;
  to: number;
  workshop: ClashInput['workshops'][number];
};

/**
 * Every clash of a timetable, in order of time. Intervals are half-open and in real time, by the camp's zone, so a
 * night on which the clocks change is judged by the hours that pass. `changeover` in minutes, for rooms and
 * instructors; players may walk straight over.
 */
export function findClashes(input: ClashInput, changeover: number): Clash[] {
  const workshops = new Map(input.workshops.map((workshop) => [workshop.id, workshop]));
  const timed = input.meetings
    .flatMap((meeting): Timed[] => {
      const workshop = workshops.get(meeting.workshopId);
      if (!workshop) return [];
      const { day, starts, lengthMinutes } = meeting;
      return [{ ...meeting, ...localInterval(day, starts, lengthMinutes, input.camp.timeZone), workshop }];
    })
    .sort((a, b) => a.from - b.from || compareText(a.id, b.id));
  const reach = changeover * 60_000;
  return timed.flatMap((meeting, at) => {
    const found = alone(meeting, input);
    // Sorted by start: the first that begins out of reach ends the search.
    for (let next = at + 1; next < timed.length; next++) {
      const other = timed[next];
      if (!other || (other.from >= meeting.to + reach && other.from > meeting.from)) break;
      found.push(...between(meeting, other, reach));
    }
    return found;
  });
}

function alone(meeting: Timed, { camp, rooms, tracks }: ClashInput): Clash[] {
  const found: Clash[] = [];
  const { id: meetingId, roomId, day, workshop } = meeting;
  if (day < camp.startsOn || day > camp.endsOn) found.push({ kind: 'outside-days', meetingId });
  const room = rooms.find(({ id }) => id === roomId);
  if (!room) return found;
  const people = expectedPeople(workshop, tracks, camp.capacity);
  if (people !== null && people > room.seats)
    found.push({ kind: 'seats', meetingId, roomId, seats: room.seats, people });
  if (tooLoudFor(workshop.kind, room.loudness))
    found.push({ kind: 'loudness', meetingId, roomId, needs: KIND_LOUDNESS[workshop.kind] });
  return found;
}

/** `a` starts first, or at the same time. */
function between(a: Timed, b: Timed, reach: number): Clash[] {
  const pair = { meetingId: a.id, otherId: b.id };
  const overlap = b.from < a.to;
  const near = overlap || b.from < a.to + reach;
  const gapMinutes = overlap ? null : (b.from - a.to) / 60_000;
  const found: Clash[] = [];
  if (near && a.roomId === b.roomId) found.push({ kind: 'room', roomId: a.roomId, ...pair, gapMinutes });
  if (near)
    for (const instructorId of shared(a.workshop.instructorIds, b.workshop.instructorIds))
      found.push({ kind: 'instructor', instructorId, ...pair, gapMinutes });
  if (!overlap) return found;
  if (a.workshop.id === b.workshop.id) found.push({ kind: 'same-workshop', ...pair });
  else if (a.workshop.audience === 'everyone' || b.workshop.audience === 'everyone')
    found.push({ kind: 'everyone', ...pair });
  else if (a.workshop.audience === 'core' && b.workshop.audience === 'core')
    for (const trackId of shared(a.workshop.trackIds, b.workshop.trackIds))
      found.push({ kind: 'track', trackId, ...pair });
  return found;
}

const shared = <T extends string>(a: readonly T[], b: readonly T[]): T[] =>
  a.filter((id) => b.includes(id)).sort(compareText);
