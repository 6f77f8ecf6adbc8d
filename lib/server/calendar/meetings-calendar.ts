import 'server-only';
import ical from 'ical-generator';
import { Temporal } from 'temporal-polyfill';
import { vtimezone } from '@/lib/domain/calendar/vtimezone';
import { needSentence } from '@/lib/domain/harp/need-sentence';
import { listWords } from '@/lib/domain/shared/list-words';
import type { Programme, ProgrammeMeeting } from '@/lib/domain/timetable/programme';
import { KIND_WORDS } from '@/lib/domain/timetable/workshop-words';

type CalendarInput = {
  programme: Pick<Programme, 'camp' | 'rooms' | 'instructors' | 'workshops'>;
  /** The camp's meetings, or the attendee's own. */
  meetings: readonly ProgrammeMeeting[];
  /** Shown by calendar programs as the calendar's name. */
  name: string;
  /** The page that says more. */
  url: string;
};

/**
 * An iCalendar object (RFC 5545) of meetings, one VEVENT each, in the camp's zone with its VTIMEZONE. UIDs are the
 * meetings' own ids and SEQUENCE goes up with each change, so a calendar program that reads it again moves what it has.
 * Without a METHOD, DTSTAMP is the last revision: the same programme gives the same text.
 */
export function meetingsCalendar({ programme, meetings, name, url }: CalendarInput): string {
  const { camp } = programme;
  const calendar = ical({
    name,
    url,
    prodId: { company: 'Combwood', product: 'Camp programme', language: 'EN' },
    timezone: { name: camp.timeZone, generator: (zone) => vtimezone(zone, camp.startsOn, camp.endsOn) },
    // A feed that is subscribed to is worth reading once an hour.
    ttl: 3600,
  });
  for (const meeting of meetings) {
    const workshop = programme.workshops.find(({ id }) => id === meeting.workshopId);
    if (!workshop) continue;
    const room = programme.rooms.find(({ id }) => id === meeting.roomId)?.name ?? '';
    const from = Temporal.PlainDateTime.from(`${meeting.day}T${meeting.starts}`).toZonedDateTime(
      camp.timeZone,
    );
    const to = from.add({ minutes: meeting.lengthMinutes });
    const zone = isPlain(from) && isPlain(to) ? camp.timeZone : 'UTC';
    calendar.createEvent({
      id: `${meeting.id}@combwood`,
      sequence: meeting.sequence,
      stamp: new Date(meeting.updatedAt),
      lastModified: new Date(meeting.updatedAt),
      timezone: zone,
      start: from.withTimeZone(zone),
      end: to.withTimeZone(zone),
      summary: oneLine(workshop.title),
      description: inWords(programme, workshop),
      location: oneLine([room, camp.venueName, camp.venueAddress].filter(Boolean).join(', ')),
      categories: [{ name: KIND_WORDS[workshop.kind] }],
      url,
    });
  }
  return calendar.toString();
}

/** False for a wall time that comes twice when clocks go back: calendar programs differ on which one it means. */
function isPlain(at: Temporal.ZonedDateTime): boolean {
  const wall = at.toPlainDateTime();
  const [earlier, later] = (['earlier', 'later'] as const).map((disambiguation) =>
    wall.toZonedDateTime(at.timeZoneId, { disambiguation }),
  );
  return earlier !== undefined && later !== undefined && earlier.equals(later);
}

const oneLine = (text: string): string => text.replace(/\s+/g, ' ').trim();

function inWords(
  { instructors }: Pick<Programme, 'instructors'>,
  { description, instructorIds, needs }: Programme['workshops'][number],
): string {
  const names = instructors.filter(({ id }) => instructorIds.includes(id)).map((person) => person.name);
  return [
    names.length > 0 ? `With ${listWords(names)}.` : '',
    needs.length > 0 ? `Harps: ${needs.map(needSentence).join('; ')}.` : '',
    description,
  ]
    .filter(Boolean)
    .join('\n');
}
