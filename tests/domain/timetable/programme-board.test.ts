import { describe, expect, test } from 'vitest';
import { programmeBoards } from '@/lib/domain/timetable/programme-board';
import { buildProgramme, meetingOf } from '../../builders/build-programme';

describe('days × times', () => {
  test('has a column for each day and a row for each time, with an end that is shared or told apart', () => {
    const programme = buildProgramme({
      meetings: [
        meetingOf('wsh_1b', 'mtg_2', { starts: '09:30', lengthMinutes: 60 }),
        meetingOf('wsh_1a', 'mtg_1', { starts: '09:30' }),
        meetingOf('wsh_1b', 'mtg_3', { day: '2026-06-10', starts: '23:00', lengthMinutes: 120 }),
      ],
    });
    const [board, ...others] = programmeBoards(programme);
    expect(others).toEqual([]);
    expect(board?.times).toEqual(['09:30', '23:00']);
    expect(board?.days.map(({ day, slots }) => [day, slots.length])).toEqual([
      ['2026-06-08', 0],
      ['2026-06-09', 1],
      ['2026-06-10', 1],
      ['2026-06-11', 0],
      ['2026-06-12', 0],
    ]);
    const morning = board?.days[1]?.slots[0];
    expect(morning?.ends).toBeNull();
    expect(morning?.meetings.map(({ title, who, room, ends }) => [title, who, room, ends])).toEqual([
      ['Bends in crossharp', 'Bending', 'Hall', '10:45'],
      ['Late jam', 'Everyone', 'Hall', '10:30'],
    ]);
    expect(board?.days[2]?.slots[0]).toMatchObject({ starts: '23:00', ends: '01:00' });
  });

  test('splits a long camp into boards of about the same width, and drops nothing', () => {
    const programme = buildProgramme({ camp: { startsOn: '2026-06-01', endsOn: '2026-06-10' } });
    const boards = programmeBoards(programme);
    expect(boards.map(({ days }) => days.length)).toEqual([5, 5]);
    const shown = boards.flatMap(({ days }) =>
      days.flatMap(({ slots }) => slots.flatMap(({ meetings }) => meetings)),
    );
    expect(shown).toHaveLength(programme.meetings.length);
  });

  test('still shows a meeting that a change of dates left outside the camp', () => {
    const programme = buildProgramme({ meetings: [meetingOf('wsh_1a', 'mtg_1', { day: '2026-06-20' })] });
    expect(programmeBoards(programme).flatMap(({ days }) => days.map(({ day }) => day))).toContain(
      '2026-06-20',
    );
  });
});
