import type { CSSProperties } from 'react';
import { sayDay, sayShortDay } from '@/lib/domain/shared/say-date';
import type { Programme } from '@/lib/domain/timetable/programme';
import { type Board, type BoardDay, programmeBoards } from '@/lib/domain/timetable/programme-board';

/**
 * Days × times. One list of days for everybody: day by day on a phone and to a screen reader; on a wide page the days
 * stand side by side and share the rows of their times.
 */
export function ProgrammeBoard({ programme }: { programme: Programme }) {
  if (programme.meetings.length === 0)
    return (
      <p className="max-w-prose text-soft">The times are still being set. Look again nearer the camp.</p>
    );
  const { startsOn, arrivalFrom } = programme.camp;
  return (
    <div className="space-y-10">
      {programmeBoards(programme).map((board) => (
        <BoardGrid key={board.days[0]?.day} board={board} arrival={{ day: startsOn, from: arrivalFrom }} />
      ))}
    </div>
  );
}

type Arrival = { day: string; from: string };

function BoardGrid({ board: { times, days }, arrival }: { board: Board; arrival: Arrival }) {
  const ends = new Map(times.map((time) => [time, rowEnd(days, time)]));
  return (
    <div
      className="programme-board"
      style={{ '--days': days.length, '--times': times.length } as CSSProperties}
    >
      <div className="programme-times" aria-hidden="true">
        <span className="programme-corner" />
        {times.map((time, row) => (
          <span key={time} className="programme-time figures" style={{ gridRow: row + 2 }}>
            {time}
            {ends.get(time) && <span className="programme-until">to {ends.get(time)}</span>}
          </span>
        ))}
      </div>
      {days.map((day) => (
        <DayColumn key={day.day} day={day} times={times} ends={ends} arrival={arrival} />
      ))}
    </div>
  );
}

/** When all that starts at this time ends together on every day, said once at the row's head; else null. */
function rowEnd(days: readonly BoardDay[], time: string): string | null {
  const ends = new Set(
    days.flatMap(({ slots }) => slots.filter(({ starts }) => starts === time).map((slot) => slot.ends)),
  );
  return ends.size === 1 ? ([...ends][0] ?? null) : null;
}

type DayColumnProps = {
  day: BoardDay;
  times: readonly string[];
  ends: ReadonlyMap<string, string | null>;
  arrival: Arrival;
};

function DayColumn({ day: { day, slots }, times, ends, arrival }: DayColumnProps) {
  const free = times.filter((time) => !slots.some(({ starts }) => starts === time));
  return (
    <section className="programme-day" aria-label={sayDay(day)}>
      <h3 className="programme-day-name">
        {sayShortDay(day)}
        {day === arrival.day && <span className="programme-arrival">Door opens {arrival.from}</span>}
      </h3>
      {slots.length === 0 && <p className="programme-none">Nothing is set on this day.</p>}
      {free.map((time) => (
        <div
          key={time}
          className="programme-gap"
          style={{ gridRow: times.indexOf(time) + 2 }}
          aria-hidden="true"
        />
      ))}
      {slots.map(({ starts, meetings }) => (
        <div key={starts} className="programme-slot" style={{ gridRow: times.indexOf(starts) + 2 }}>
          <p className="programme-slot-time">
            <time>{starts}</time>
            {ends.get(starts) && <span className="programme-until">to {ends.get(starts)}</span>}
          </p>
          <ul className="min-w-0 space-y-2">
            {meetings.map((meeting) => (
              <li key={meeting.id} className="text-small leading-snug">
                <a
                  href={`#${meeting.workshopId}`}
                  className="break-words font-semibold text-ink no-underline hover:underline"
                >
                  {meeting.title}
                </a>
                <span className="block break-words text-soft">
                  {[meeting.who, meeting.room].filter(Boolean).join(' · ')}
                  {!ends.get(starts) && `, until ${meeting.ends}`}
                </span>
              </li>
            ))}
          </ul>
        </div>
      ))}
    </section>
  );
}
