import type { Route } from 'next';
import Link from 'next/link';
import { clockAfter } from '@/lib/domain/shared/local-time';
import { sayShortDay } from '@/lib/domain/shared/say-date';
import type { GridCell, GridLane, GridRow } from '@/lib/domain/timetable/build-grid';
import { isRefused } from '@/lib/domain/timetable/clash';
import { clashSentence } from '@/lib/domain/timetable/clash-sentence';
import { clashesOf } from '@/lib/domain/timetable/clashes-of';
import type { ProgrammeMeeting } from '@/lib/domain/timetable/programme';
import type { GridProps } from './grid-table';
import { MeetingCard } from './meeting-card';
import { titleOfMeeting } from './title-of-meeting';
import { filtersOf, timetableHref } from './view';

type CellProps = GridProps & { cell: GridCell; row: GridRow; room: GridLane['room'] };

/** One room at one time on one day: its meetings, or a place to put one. */
export function GridCellView({ cell, row, room, ...props }: CellProps) {
  const { programme, clashes, view, mayEdit, meeting } = props;
  return (
    <>
      {cell.running.map(({ id, starts, lengthMinutes }) => (
        <p key={id} className="border-l-2 border-edge pl-2 text-soft">
          {titleOfMeeting(programme, id)} until <time>{clockAfter(starts, lengthMinutes)}</time>
        </p>
      ))}
      {cell.meetings.map((one) => (
        <MeetingCard
          key={one.id}
          meeting={one}
          programme={programme}
          clashes={clashes}
          href={
            mayEdit ? `${timetableHref(programme.camp.id, filtersOf(view), { move: one.id })}#place` : null
          }
          moving={one.id === meeting?.id}
        />
      ))}
      {mayEdit && cell.meetings.length + cell.running.length === 0 && (
        <Free cell={cell} row={row} room={room} {...props} />
      )}
    </>
  );
}

function Free({ cell, row, room, ...props }: CellProps) {
  const { programme, view, changeover, workshop, meeting } = props;
  const candidate: ProgrammeMeeting | null =
    workshop || meeting
      ? {
          id: meeting?.id ?? 'mtg_candidate',
          workshopId: meeting?.workshopId ?? workshop?.id ?? 'wsh_',
          roomId: room.id,
          day: cell.day,
          starts: row.starts,
          lengthMinutes: meeting?.lengthMinutes ?? workshop?.lengthMinutes ?? 60,
          sequence: 0,
          updatedAt: 0,
        }
      : null;
  const found = candidate ? clashesOf(candidate, programme, changeover) : [];
  const names = candidate
    ? { ...programme, meetings: [...programme.meetings.filter(({ id }) => id !== candidate.id), candidate] }
    : programme;
  const say = (some: typeof found) =>
    some.map((clash) => clashSentence(clash, names, candidate?.id)).join(' ');
  const refused = found.filter(isRefused);
  if (refused.length > 0) return <p className="px-1 py-1 text-soft print:hidden">{say(refused)}</p>;
  const href = timetableHref(programme.camp.id, filtersOf(view), {
    ...(meeting ? { move: meeting.id } : workshop && { place: workshop.id }),
    day: cell.day,
    starts: row.starts,
    room: room.id,
  });
  const chosen = view.day === cell.day && view.starts === row.starts && view.room === room.id;
  const where = `${room.name}, ${sayShortDay(cell.day)} ${row.starts}`;
  return (
    <Link
      href={`${href}#place` as Route}
      aria-label={`${candidate ? 'Place here' : 'Place something here'}: ${where}`}
      aria-current={chosen ? 'true' : undefined}
      className={`flex min-h-target items-center justify-center rounded border-2 px-2 text-center no-underline hover:border-pine aria-[current]:border-pine aria-[current]:bg-brass aria-[current]:text-on-brass print:hidden ${candidate ? 'border-moss text-moss' : 'border-transparent text-soft'}`}
    >
      {chosen ? (
        'Chosen'
      ) : candidate ? (
        <span>Fits here {found.length > 0 && <small>({say(found)})</small>}</span>
      ) : (
        '+'
      )}
    </Link>
  );
}
