import { compareText } from '../shared/compare-text';
import type { RoomId } from '../shared/ids';
import { clockAfter, daysBetween } from '../shared/local-time';
import type { Programme, ProgrammeMeeting, ProgrammeRoom } from './programme';

export type GridCell = {
  day: string;
  meetings: ProgrammeMeeting[];
  /** Begun in a row above and still on. */
  running: ProgrammeMeeting[];
};
export type GridLane = { room: Pick<ProgrammeRoom, 'id' | 'name'>; cells: GridCell[] };
/** A stretch of the day: one of the camp's blocks, or (`ends` null) a start of its own. */
export type GridRow = { starts: string; ends: string | null; label: string; lanes: GridLane[] };
export type Grid = { days: string[]; rows: GridRow[] };

type GridInput = Pick<Programme, 'rooms' | 'blocks' | 'meetings'> & {
  camp: Pick<Programme['camp'], 'startsOn' | 'endsOn'>;
};

/**
 * The timetable as a table: days across, time down, rooms as lanes of each time. A meeting stands in the block that
 * its start falls in; one that starts between blocks gets a row of its own. Days outside the camp that still hold a
 * meeting are added, so that none is hidden.
 */
export function buildGrid({ camp, rooms, blocks, meetings }: GridInput): Grid {
  const days = [
    ...new Set([...daysBetween(camp.startsOn, camp.endsOn), ...meetings.map(({ day }) => day)]),
  ].sort(compareText);
  const stretches = new Map(
    [...blocks]
      .reverse()
      .map(({ starts, ends, label }) => [starts, { starts, ends: ends as string | null, label }]),
  );
  const rowOf = (starts: string): string =>
    stretches.has(starts)
      ? starts
      : (blocks.findLast((block) => block.starts <= starts && starts < endOf(block))?.starts ?? starts);
  for (const { starts } of meetings) {
    const row = rowOf(starts);
    if (!stretches.has(row)) stretches.set(row, { starts: row, ends: null, label: '' });
  }
  const order = [...stretches.values()].sort((a, b) => compareText(a.starts, b.starts));
  const lane = (row: string, room: GridLane['room']): GridLane => ({
    room: { id: room.id, name: room.name },
    cells: days.map((day) => cell(row, day, room.id)),
  });
  const cell = (row: string, day: string, roomId: RoomId): GridCell => {
    const here = meetings
      .filter((meeting) => meeting.day === day && meeting.roomId === roomId)
      .sort((a, b) => compareText(a.starts, b.starts) || compareText(a.id, b.id));
    return {
      day,
      meetings: here.filter(({ starts }) => rowOf(starts) === row),
      running: here.filter((meeting) => rowOf(meeting.starts) < row && endOfMeeting(meeting) > row),
    };
  };
  return {
    days,
    rows: order.map((stretch) => ({ ...stretch, lanes: rooms.map((room) => lane(stretch.starts, room)) })),
  };
}

/** Past midnight counts as the end of the day: rows of a day run from its first block to its last. */
const endOf = ({ starts, ends }: { starts: string; ends: string }): string =>
  ends <= starts ? '24:00' : ends;
const endOfMeeting = ({ starts, lengthMinutes }: ProgrammeMeeting): string =>
  endOf({ starts, ends: clockAfter(starts, lengthMinutes) });
