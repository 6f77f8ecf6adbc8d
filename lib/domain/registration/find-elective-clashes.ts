import type { TrackId, WorkshopId } from '../shared/ids';
import { daysAround, localInterval } from '../shared/local-time';
import { ownMeetings } from '../timetable/own-meetings';
import type { Programme } from '../timetable/programme';

export type ElectiveClash = {
  elective: WorkshopId;
  title: string;
  other: string;
  day: string;
  starts: string;
};

/**
 * Where a chosen elective meets at the same time as something else this attendee has chosen or gets with the track.
 * What is for everyone (an open jam, a concert) is no duty and does not clash. Times are half-open.
 */
export function findElectiveClashes(
  programme: Pick<Programme, 'workshops' | 'meetings'> & { camp: { timeZone: string } },
  wanted: { trackId: TrackId; electives: readonly WorkshopId[] },
): ElectiveClash[] {
  const own = ownMeetings(programme, wanted).filter(({ workshop }) => workshop.audience !== 'everyone');
  // Only what lies around a chosen elective can clash with one; instants are the costly part.
  const days = new Set(
    own.filter(({ workshop }) => workshop.audience === 'elective').flatMap(({ day }) => daysAround(day)),
  );
  const mine = own
    .filter(({ day }) => days.has(day))
    .map((meeting) => ({
      ...meeting,
      ...localInterval(meeting.day, meeting.starts, meeting.lengthMinutes, programme.camp.timeZone),
    }));
  const clashes: ElectiveClash[] = [];
  for (const [at, first] of mine.entries())
    for (const second of mine.slice(at + 1)) {
      if (first.workshopId === second.workshopId || first.from >= second.to || second.from >= first.to)
        continue;
      const elective = second.workshop.audience === 'elective' ? second : first;
      if (elective.workshop.audience !== 'elective') continue;
      const other = elective === second ? first : second;
      clashes.push({
        elective: elective.workshopId,
        title: elective.workshop.title,
        other: other.workshop.title,
        day: elective.day,
        starts: elective.starts,
      });
    }
  return clashes;
}
