import 'server-only';
import { clockAfter } from '@/lib/domain/shared/local-time';
import { sayShortDay } from '@/lib/domain/shared/say-date';
import type { Programme, ProgrammeMeeting } from '@/lib/domain/timetable/programme';

/** "Tue 9 June 10:00–11:15 in Hall", for the record of who changed what. */
export function saySlot(programme: Programme, meeting: ProgrammeMeeting): string {
  const { day, starts, lengthMinutes, roomId } = meeting;
  const room = programme.rooms.find(({ id }) => id === roomId)?.name ?? roomId;
  return `${sayShortDay(day)} ${starts}–${clockAfter(starts, lengthMinutes)} in ${room}`;
}

export const titleOf = (programme: Programme, meeting: Pick<ProgrammeMeeting, 'workshopId'>): string =>
  programme.workshops.find(({ id }) => id === meeting.workshopId)?.title ?? meeting.workshopId;
