import type { MeetingId } from '@/lib/domain/shared/ids';
import type { Programme } from '@/lib/domain/timetable/programme';

export function titleOfMeeting(programme: Programme, id: MeetingId): string {
  const meeting = programme.meetings.find((row) => row.id === id);
  return programme.workshops.find((row) => row.id === meeting?.workshopId)?.title ?? '';
}
