import { expect, test } from 'vitest';
import { changeoverMinutes } from '@/lib/domain/timetable/changeover';
import type { Clash } from '@/lib/domain/timetable/clash';
import { findClashes } from '@/lib/domain/timetable/find-clashes';
import { input, meeting, workshop } from './programme-parts';

const kinds = (clashes: Clash[]) => clashes.map(({ kind }) => kind);
const core = workshop('core');
const other = workshop('other', { trackIds: ['trk_b'] });
const barn = { roomId: 'rom_barn' } as const;

test('two meetings in one room at one time clash, half-open: the end is free', () => {
  const at = (starts: string) =>
    kinds(findClashes(input([core, other], [meeting('a', 'core'), meeting('b', 'other', { starts })]), 0));
  expect(at('10:00')).toEqual(['room']);
  expect(at('11:14')).toEqual(['room']);
  expect(at('11:15')).toEqual([]);
  expect(at('08:45')).toEqual([]);
  expect(at('08:46')).toEqual(['room']);
});

test('a changeover is kept between two meetings of a room, and told by its minutes', () => {
  const at = (starts: string, changeover: number) =>
    findClashes(
      input([core, other], [meeting('a', 'core'), meeting('b', 'other', { starts })]),
      changeover,
    ).map((clash) => 'gapMinutes' in clash && clash.gapMinutes);
  expect(at('11:20', 15)).toEqual([5]);
  expect(at('11:15', 15)).toEqual([0]);
  expect(at('11:10', 15)).toEqual([null]);
  expect(at('11:30', 15)).toEqual([]);
});

test('an instructor cannot be in two rooms, nor rush between them', () => {
  const taught = { instructorIds: ['ins_ana', 'ins_bo'] } as Partial<typeof core>;
  const both = [
    workshop('core', taught),
    workshop('other', { trackIds: ['trk_b'], instructorIds: ['ins_bo'] }),
  ];
  const at = (starts: string) =>
    findClashes(input(both, [meeting('a', 'core'), meeting('b', 'other', { starts, ...barn })]), 15).filter(
      ({ kind }) => kind === 'instructor',
    );
  expect(at('10:30')).toEqual([
    { kind: 'instructor', instructorId: 'ins_bo', meetingId: 'mtg_a', otherId: 'mtg_b', gapMinutes: null },
  ]);
  expect(at('11:25')).toHaveLength(1);
  expect(at('11:30')).toEqual([]);
});

test('whose time is taken twice', () => {
  const elective = workshop('elective', { audience: 'elective', trackIds: [], capacity: 8 });
  const second = workshop('second', { audience: 'elective', trackIds: [], capacity: 8 });
  const all = workshop('all', { audience: 'everyone', trackIds: [] });
  const sameTrack = workshop('same');
  const pair = (a: typeof core, b: typeof core) =>
    kinds(
      findClashes(
        input(a.id === b.id ? [a] : [a, b], [
          meeting('a', a.title),
          meeting('b', b.title, { ...barn, starts: '10:30' }),
        ]),
        0,
      ),
    ).filter((kind) => kind !== 'seats');
  expect(pair(core, sameTrack)).toEqual(['track']);
  expect(pair(core, other)).toEqual([]);
  expect(pair(core, elective)).toEqual([]);
  expect(pair(elective, second)).toEqual([]);
  expect(pair(all, elective)).toEqual(['everyone']);
  expect(pair(core, all)).toEqual(['everyone']);
  expect(pair(elective, elective)).toEqual(['same-workshop']);
});

test('seats are weighed against the most that may come', () => {
  const seats = (more: Partial<typeof core>) =>
    findClashes(input([workshop('core', more)], [meeting('a', 'core', barn)]), 0).map(
      (clash) => clash.kind === 'seats' && clash.people,
    );
  expect(seats({})).toEqual([20]);
  expect(seats({ trackIds: ['trk_a', 'trk_b'] })).toEqual([40]);
  expect(seats({ capacity: 12 })).toEqual([]);
  expect(seats({ capacity: 13 })).toEqual([13]);
  expect(seats({ audience: 'everyone' })).toEqual([60]);
  expect(seats({ audience: 'elective', capacity: null })).toEqual([]);
});

test('an amplified kind in a quiet room, and a day that is none of the camp’s', () => {
  const jam = workshop('jam', { kind: 'jam', audience: 'elective', capacity: 8 });
  expect(findClashes(input([jam], [meeting('a', 'jam', barn)]), 0)).toEqual([
    { kind: 'loudness', meetingId: 'mtg_a', roomId: 'rom_barn', needs: 'amplified' },
  ]);
  expect(kinds(findClashes(input([jam], [meeting('a', 'jam', { day: '2026-06-13' })]), 0))).toEqual([
    'outside-days',
  ]);
});

test('a jam past midnight meets the next morning', () => {
  const late = meeting('a', 'core', { starts: '23:00', lengthMinutes: 120 });
  const early = (starts: string) => meeting('b', 'other', { day: '2026-06-09', starts });
  expect(kinds(findClashes(input([core, other], [late, early('00:30')]), 0))).toEqual(['room']);
  expect(findClashes(input([core, other], [late, early('01:00')]), 0)).toEqual([]);
});

// IANA tz database: New York skips 02:00–03:00 on 2026-03-08 (a day of 23 h) and repeats 01:00–02:00 on 2026-11-01
// (25 h); Lord Howe moves by half an hour only, skipping 02:00–02:30 on 2026-10-04 (23.5 h).
test.each([
  // wall time says 2.5 h apart, real time 1.5 h: a two-hour jam from 01:00 still plays at 03:30
  ['America/New_York', '2026-03-08', '01:00', 120, '03:30', ['room']],
  ['America/New_York', '2026-03-08', '01:00', 120, '04:00', []],
  // an hour more passes than the wall shows: 01:30 (first) + 60 min ends at the second 01:30, half an hour before 02:00
  ['America/New_York', '2026-11-01', '00:30', 90, '02:00', []],
  ['America/New_York', '2026-11-01', '00:30', 151, '02:00', ['room']],
  ['America/New_York', '2026-11-01', '00:30', 150, '02:00', []],
  // half an hour is lost: 01:00 + 60 min ends at 02:30 on the wall
  ['Australia/Lord_Howe', '2026-10-04', '01:00', 60, '02:30', []],
  ['Australia/Lord_Howe', '2026-10-04', '01:00', 61, '02:30', ['room']],
  // 02:10 does not exist there; it is taken for 02:40
  ['Australia/Lord_Howe', '2026-10-04', '02:10', 30, '02:45', ['room']],
] as const)(
  'clocks change in %s on %s: %s for %i min, then %s',
  (timeZone, day, starts, lengthMinutes, next, expected) => {
    const clashes = findClashes(
      input(
        [core, other],
        [meeting('a', 'core', { day, starts, lengthMinutes }), meeting('b', 'other', { day, starts: next })],
        { timeZone, startsOn: day, endsOn: day },
      ),
      0,
    );
    expect(kinds(clashes)).toEqual(expected);
  },
);

test('changeover: 15 minutes, or what the camp’s blocks leave', () => {
  const block = (starts: string, ends: string) => ({ starts, ends });
  expect(changeoverMinutes([])).toBe(15);
  expect(changeoverMinutes([block('09:00', '10:15'), block('10:30', '11:45')])).toBe(15);
  expect(changeoverMinutes([block('09:00', '10:15'), block('10:25', '11:45')])).toBe(10);
  expect(changeoverMinutes([block('09:00', '10:15'), block('10:15', '11:30'), block('12:00', '13:00')])).toBe(
    0,
  );
  expect(changeoverMinutes([block('09:00', '10:15'), block('10:00', '11:30')])).toBe(15);
  expect(changeoverMinutes([block('20:00', '00:30'), block('09:00', '10:00')])).toBe(15);
});
