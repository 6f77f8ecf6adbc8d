import type { Programme, ProgrammeMeeting } from '@/lib/domain/timetable/programme';
import type { View } from './view';

/** Do the page's filters let this meeting through? What is for everyone belongs to every track. */
export function showsMeeting(programme: Programme, meeting: ProgrammeMeeting, view: View): boolean {
  const workshop = programme.workshops.find(({ id }) => id === meeting.workshopId);
  if (!workshop) return false;
  const ofTrack =
    !view.track || workshop.audience === 'everyone' || workshop.trackIds.some((id) => id === view.track);
  const taught = !view.instructor || workshop.instructorIds.some((id) => id === view.instructor);
  return ofTrack && taught && (!view.in || meeting.roomId === view.in);
}
