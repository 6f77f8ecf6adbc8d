import { clockAfter } from '../shared/local-time';
import type { Programme, ProgrammeMeeting } from '../timetable/programme';
import type { PackingMeeting } from './packing-meeting';

/** Meetings of a programme as the packing list reads them; one whose workshop is gone is left out. */
export function toPackingMeetings(
  { workshops, rooms }: Pick<Programme, 'workshops' | 'rooms'>,
  meetings: readonly ProgrammeMeeting[],
): PackingMeeting[] {
  return meetings.flatMap(({ id, workshopId, roomId, day, starts, lengthMinutes }) => {
    const workshop = workshops.find((each) => each.id === workshopId);
    if (!workshop) return [];
    const room = rooms.find((each) => each.id === roomId)?.name ?? '';
    const ends = clockAfter(starts, lengthMinutes);
    return [{ id, workshop: workshop.title, day, starts, ends, room, needs: workshop.needs }];
  });
}
