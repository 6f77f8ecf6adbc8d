import 'server-only';
import { meetingsCalendar } from '../calendar/meetings-calendar';
import { env } from '../env';
import { type Attendee, loadAttendee } from '../packing/load-attendee';
import type { OrderView } from './load-order';

/** One attendee's own meetings as an iCalendar text; null while none are placed. */
export function attendeeCalendar({ programme, meetings, person }: Attendee): string | null {
  if (meetings.length === 0) return null;
  const url = `${env().BASE_URL}/my/registrations/${person.id}/packing-list`;
  const name = `${programme.camp.name}: ${person.attendeeName}`;
  return meetingsCalendar({ programme, meetings, name, url });
}

/** A calendar file for each seated attendee of an order. File names are ours, never the attendee's (ASVS 5.4.2). */
export function orderCalendars(view: OrderView): { filename: string; text: string }[] {
  return view.registrations.flatMap(({ id, ticket }, index) => {
    const attendee = ticket && loadAttendee(id);
    const text = attendee && attendeeCalendar(attendee);
    return text ? [{ filename: `timetable-${view.order.reference}-${index + 1}.ics`, text }] : [];
  });
}
