import { clockAfter } from '@/lib/domain/shared/local-time';
import { sayDay } from '@/lib/domain/shared/say-date';
import type { Programme, ProgrammeMeeting, ProgrammeWorkshop } from '@/lib/domain/timetable/programme';
import { KIND_WORDS } from '@/lib/domain/timetable/workshop-words';

type OwnDaysProps = {
  programme: Pick<Programme, 'rooms' | 'instructors'>;
  meetings: readonly (ProgrammeMeeting & { workshop: ProgrammeWorkshop })[];
};

/** One person's meetings, a list for each day. */
export function OwnDays({ programme, meetings }: OwnDaysProps) {
  if (meetings.length === 0)
    return (
      <p className="max-w-prose text-soft">The times are still being set. Look again nearer the camp.</p>
    );
  const days = [...new Set(meetings.map(({ day }) => day))];
  const room = (id: string) => programme.rooms.find((known) => known.id === id)?.name;
  const people = (ids: readonly string[]) =>
    programme.instructors.filter(({ id }) => ids.includes(id)).map(({ name }) => name);
  return (
    <ol className="print:columns-2 print:gap-6">
      {days.map((day) => (
        <li
          key={day}
          className="border-b border-line py-4 first:pt-0 last:border-b-0 print:break-inside-avoid print:py-1"
        >
          <h3 className="print:text-[12px]">{sayDay(day)}</h3>
          <ol className="mt-2 print:mt-0">
            {meetings
              .filter((meeting) => meeting.day === day)
              .map(({ id, starts, lengthMinutes, roomId, workshop }) => (
                <li
                  key={id}
                  className="grid gap-x-4 py-1.5 sm:grid-cols-[8rem_1fr] print:grid-cols-[auto_1fr] print:gap-x-2 print:py-0 print:text-[10px]"
                >
                  <span className="figures whitespace-nowrap">
                    <time dateTime={`${day}T${starts}`}>{starts}</time>–
                    <time>{clockAfter(starts, lengthMinutes)}</time>
                  </span>
                  <span className="min-w-0 break-words">
                    <strong className="font-semibold">{workshop.title}</strong>
                    <span className="block text-small text-soft print:inline print:text-[10px] print:before:content-['_·_']">
                      {[KIND_WORDS[workshop.kind], room(roomId), ...people(workshop.instructorIds)]
                        .filter(Boolean)
                        .join(' · ')}
                    </span>
                  </span>
                </li>
              ))}
          </ol>
        </li>
      ))}
    </ol>
  );
}
