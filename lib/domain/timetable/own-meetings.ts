import type { TrackId, WorkshopId } from '../shared/ids';
import type { Programme, ProgrammeMeeting, ProgrammeWorkshop } from './programme';

/** Does an attendee of this track, with these electives, take part in the workshop? */
export function takesPart(
  workshop: Pick<ProgrammeWorkshop, 'id' | 'audience' | 'trackIds'>,
  attendee: { trackId: TrackId; electives: readonly WorkshopId[] },
): boolean {
  if (workshop.audience === 'everyone') return true;
  if (workshop.audience === 'core') return workshop.trackIds.includes(attendee.trackId);
  return attendee.electives.includes(workshop.id);
}

/** The meetings an attendee goes to, in order of time. */
export function ownMeetings(
  programme: Pick<Programme, 'workshops' | 'meetings'>,
  attendee: { trackId: TrackId; electives: readonly WorkshopId[] },
): (ProgrammeMeeting & { workshop: ProgrammeWorkshop })[] {
  const mine = new Map(
    programme.workshops
      .filter((workshop) => takesPart(workshop, attendee))
      .map((workshop) => [workshop.id, workshop]),
  );
  return programme.meetings
    .flatMap((meeting) => {
      const workshop = mine.get(meeting.workshopId);
      return workshop ? [{ ...meeting, workshop }] : [];
    })
    .sort(
      (a, b) => a.day.localeCompare(b.day) || a.starts.localeCompare(b.starts) || a.id.localeCompare(b.id),
    );
}
