import { expect, test } from 'vitest';
import { buildGrid, type Grid } from '@/lib/domain/timetable/build-grid';
import type { ProgrammeMeeting, ProgrammeRoom } from '@/lib/domain/timetable/programme';
import { CAMP, meeting, ROOMS } from './programme-parts';

const BLOCKS = [
  { id: 'blk_1', starts: '09:30', ends: '10:45', label: '' },
  { id: 'blk_2', starts: '11:00', ends: '12:15', label: '' },
  { id: 'blk_3', starts: '20:00', ends: '00:30', label: 'Evening' },
];
const grid = (...meetings: ReturnType<typeof meeting>[]) =>
  buildGrid({
    camp: CAMP,
    rooms: ROOMS as unknown as ProgrammeRoom[],
    blocks: BLOCKS,
    meetings: meetings as ProgrammeMeeting[],
  });
const where = ({ rows }: Grid, kind: 'meetings' | 'running' = 'meetings') =>
  rows.flatMap(({ starts, lanes }) =>
    lanes.flatMap(({ room, cells }) =>
      cells.flatMap((cell) =>
        cell[kind].map(({ id }) => `${id} ${cell.day.slice(-2)} ${starts} ${room.name}`),
      ),
    ),
  );

test('days across, the camp’s blocks down, a lane for each room', () => {
  const empty = grid();
  expect(empty.days).toEqual(['2026-06-08', '2026-06-09', '2026-06-10', '2026-06-11', '2026-06-12']);
  expect(empty.rows.map(({ starts }) => starts)).toEqual(['09:30', '11:00', '20:00']);
  expect(empty.rows[0]?.lanes.map(({ room }) => room.name)).toEqual(['Hall', 'Barn']);
  expect(where(empty)).toEqual([]);
});

test('a meeting stands in the block it starts in, or in a row of its own between blocks', () => {
  const full = grid(
    meeting('a', 'x', { starts: '09:30' }),
    meeting('b', 'x', { starts: '10:00', roomId: 'rom_barn' }),
    meeting('c', 'x', { starts: '13:00', day: '2026-06-10' }),
    meeting('d', 'x', { starts: '23:45', day: '2026-06-10' }),
  );
  expect(full.rows.map(({ starts, ends }) => [starts, ends])).toEqual([
    ['09:30', '10:45'],
    ['11:00', '12:15'],
    ['13:00', null],
    ['20:00', '00:30'],
  ]);
  expect(where(full)).toEqual([
    'mtg_a 08 09:30 Hall',
    'mtg_b 08 09:30 Barn',
    'mtg_c 10 13:00 Hall',
    'mtg_d 10 20:00 Hall',
  ]);
});

test('what is still on is shown in the rows below, and a day outside the camp is not hidden', () => {
  const full = grid(
    meeting('a', 'x', { starts: '09:30', lengthMinutes: 120 }),
    meeting('b', 'x', { day: '2026-06-20', lengthMinutes: 30 }),
  );
  expect(where(full, 'running')).toEqual(['mtg_a 08 11:00 Hall']);
  expect(full.days.at(-1)).toBe('2026-06-20');
});
