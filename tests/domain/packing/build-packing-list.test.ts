import { describe, expect, test } from 'vitest';
import type { HarpAsk, HarpNeed } from '@/lib/domain/harp/harp-ask';
import { parseHarpLabel } from '@/lib/domain/harp/parse-harp-label';
import { parsePitchClass } from '@/lib/domain/harp/parse-pitch-class';
import type { Position } from '@/lib/domain/harp/position';
import { parseSongKey } from '@/lib/domain/harp/song-key';
import { buildPackingList } from '@/lib/domain/packing/build-packing-list';
import type { PackingMeeting } from '@/lib/domain/packing/packing-meeting';

const usual = { tuning: 'richter', register: 'standard' } as const;

function must<T>(value: T | null): T {
  if (value === null) throw new Error('The test names something that does not exist.');
  return value;
}

const song = (key: string, position: Position): HarpAsk => ({
  by: 'song',
  songKey: must(parseSongKey(key)),
  position,
  ...usual,
});
const cover = (key: string, over: Partial<Extract<HarpAsk, { by: 'harp' }>> = {}): HarpAsk => ({
  by: 'harp',
  labelKey: must(parsePitchClass(key)),
  ...usual,
  ...over,
});
const need = (...anyOf: HarpAsk[]): HarpNeed => ({ level: 'required', anyOf });
const helpful = (...anyOf: HarpAsk[]): HarpNeed => ({ level: 'helpful', anyOf });
const harp = (label: string) => must(parseHarpLabel(label));

const meeting = (id: string, needs: HarpNeed[], over: Partial<PackingMeeting> = {}): PackingMeeting => ({
  id,
  workshop: `Workshop ${id}`,
  day: '2026-07-14',
  starts: '10:00',
  ends: '11:15',
  room: 'Boat house',
  needs,
  ...over,
});

const labels = (needs: HarpNeed[]): string[] =>
  buildPackingList({ meetings: [meeting('mtg_1', needs)], owned: [] }).lines.map(({ label }) => label);

describe('the check cases of our trade facts, section 9 (our own design, keys by the rule of S10)', () => {
  test.each([
    ['song E, 2nd position', song('E', 2), 'A'],
    ['Gm, 3rd', song('Gm', 3), 'F'],
    ['Am, 4th', song('Am', 4), 'C'],
    ['B, 2nd', song('B', 2), 'E'],
    ['Ab, 2nd', song('Ab', 2), 'Db'],
  ])('%s', (_, ask, label) => {
    expect(labels([need(ask)])).toEqual([label]);
  });

  test('a natural minor labelled Gm has C on hole 1', () => {
    const [line] = buildPackingList({
      meetings: [meeting('mtg_1', [need(cover('G', { tuning: 'natural-minor' }))])],
      owned: [],
    }).lines;
    expect(line?.harp).toEqual({ root: 'C', tuning: 'natural-minor', register: 'standard' });
    expect(line?.label).toBe('Gm natural minor');
  });

  test('two meetings asking F# and Gb make one line', () => {
    const { lines } = buildPackingList({
      meetings: [meeting('mtg_1', [need(cover('F#'))]), meeting('mtg_2', [need(cover('Gb'))])],
      owned: [],
    });
    expect(lines.map(({ label, uses }) => [label, uses.map((use) => use.meetingId)])).toEqual([
      ['F#', ['mtg_1', 'mtg_2']],
    ]);
  });

  test('when the only meeting that uses E is dropped, E leaves the list', () => {
    const a = meeting('mtg_1', [need(cover('A'))]);
    const e = meeting('mtg_2', [need(cover('E'))]);
    expect(buildPackingList({ meetings: [a, e], owned: [] }).lines.map((line) => line.label)).toEqual([
      'A',
      'E',
    ]);
    expect(buildPackingList({ meetings: [a], owned: [] }).lines.map((line) => line.label)).toEqual(['A']);
  });

  test('Low F and F are two lines, in pitch order', () => {
    expect(labels([need(cover('F')), need(cover('F', { register: 'low' }))])).toEqual(['Low F', 'F']);
  });
});

describe('alternatives', () => {
  const tuesday = meeting('mtg_1', [need(cover('A'), cover('D'))]);
  const thursday = meeting('mtg_2', [need(cover('D'), cover('G'))], { day: '2026-07-16', starts: '14:00' });

  test('one harp for two meetings, and it says so', () => {
    const { lines, proven } = buildPackingList({ meetings: [tuesday, thursday], owned: [] });
    expect(lines.map(({ label, source, why }) => ({ label, source, why }))).toEqual([
      {
        label: 'D',
        source: 'bring',
        why: 'Take D: one harp serves Tue 14 July 10:00 and Thu 16 July 14:00.',
      },
    ]);
    expect(proven).toBe(true);
  });

  test('own harps come before a purchase, even when it takes two', () => {
    const { lines } = buildPackingList({ meetings: [tuesday, thursday], owned: [harp('A'), harp('G')] });
    expect(lines.map(({ label, source }) => [label, source])).toEqual([
      ['G', 'owned'],
      ['A', 'owned'],
    ]);
    expect(lines[0]?.why).toBe('You own G, so it serves Thu 16 July 14:00, where D would do too.');
  });

  test('a reserved loaner comes before a purchase and after one of one’s own', () => {
    const loan = buildPackingList({ meetings: [tuesday], owned: [], loaners: [harp('D')] });
    expect(loan.lines.map(({ label, source }) => [label, source])).toEqual([['D', 'loaner']]);
    const own = buildPackingList({ meetings: [tuesday], owned: [harp('A')], loaners: [harp('D')] });
    expect(own.lines.map(({ label, source }) => [label, source])).toEqual([['A', 'owned']]);
  });

  test('a harp needed anyway serves the open choice', () => {
    const { lines } = buildPackingList({
      meetings: [tuesday, meeting('mtg_3', [need(cover('D'))], { day: '2026-07-15' })],
      owned: [],
    });
    expect(lines.map(({ label, why }) => [label, why])).toEqual([
      ['D', 'D is needed anyway, so it serves Tue 14 July 10:00, where A would do too.'],
    ]);
  });

  test('a plain tie names the commoner harp and says that the other will do', () => {
    const { lines } = buildPackingList({
      meetings: [meeting('mtg_1', [need(cover('Db'), cover('D'))])],
      owned: [],
    });
    expect(lines.map(({ label, why }) => [label, why])).toEqual([
      ['D', 'D or Db will do: bring one of them.'],
    ]);
  });

  test('nothing to choose, nothing to explain; the other harps that would do are named on each use', () => {
    const { lines } = buildPackingList({ meetings: [tuesday], owned: [harp('D')] });
    expect(lines[0]?.uses[0]?.others).toEqual(['A']);
    const fixed = buildPackingList({ meetings: [meeting('mtg_1', [need(song('E', 2))])], owned: [] });
    expect(fixed.lines[0]?.why).toBeNull();
    expect(fixed.lines[0]?.uses[0]?.sentence).toBe('song in E, 2nd position → A harp');
  });
});

describe('levels', () => {
  test('helpful harps stand apart and never push a required choice', () => {
    const { lines } = buildPackingList({
      meetings: [meeting('mtg_1', [need(cover('A'), cover('D'))]), meeting('mtg_2', [helpful(cover('D'))])],
      owned: [],
    });
    expect(lines.map(({ label, level }) => [label, level])).toEqual([
      ['A', 'required'],
      ['D', 'helpful'],
    ]);
  });

  test('a helpful need that a required harp meets adds no line', () => {
    const { lines } = buildPackingList({
      meetings: [meeting('mtg_1', [need(cover('A'))]), meeting('mtg_2', [helpful(cover('A'), cover('D'))])],
      owned: [],
    });
    expect(lines.map(({ label, level, uses }) => [label, level, uses.map((use) => use.level)])).toEqual([
      ['A', 'required', ['required', 'helpful']],
    ]);
  });

  test('any key asks for no harp, and is told at the door of the room', () => {
    const list = buildPackingList({ meetings: [meeting('mtg_1', [need()])], owned: [] });
    expect(list.lines).toEqual([]);
    expect(list.days[0]?.stops[0]?.anyKey).toEqual([{ level: 'required', note: '' }]);
  });
});

test('by day: what to carry to which room, first use first', () => {
  const { days, lines } = buildPackingList({
    meetings: [
      meeting('mtg_3', [need(song('E', 2))], { day: '2026-07-15', room: 'Hall' }),
      meeting('mtg_2', [need(cover('C')), need(cover('A'))], {
        starts: '14:00',
        ends: '15:15',
        room: 'Loft',
      }),
      meeting('mtg_1', [need(cover('A'))]),
      meeting('mtg_4', []),
    ],
    owned: [],
  });
  expect(
    days.map(({ day, carry, stops }) => [
      day,
      carry.map(({ label }) => label),
      stops.map(({ starts, room, carry: inHand }) => [starts, room, inHand.map(({ label }) => label)]),
    ]),
  ).toEqual([
    [
      '2026-07-14',
      ['A', 'C'],
      [
        ['10:00', 'Boat house', ['A']],
        ['14:00', 'Loft', ['A', 'C']],
      ],
    ],
    ['2026-07-15', ['A'], [['10:00', 'Hall', ['A']]]],
  ]);
  expect(lines.map(({ label, uses }) => [label, uses[0]?.meetingId])).toEqual([
    ['A', 'mtg_1'],
    ['C', 'mtg_2'],
  ]);
});

test('two songs that lead to the same harp at one meeting are both told', () => {
  const { lines } = buildPackingList({
    meetings: [meeting('mtg_1', [need(song('E', 2), song('Bm', 3), cover('A'))])],
    owned: [],
  });
  expect(lines.map(({ label, why, uses }) => [label, why, uses.map(({ sentence }) => sentence)])).toEqual([
    ['A', null, ['song in Bm, 3rd position → A harp; song in E, 2nd position → A harp']],
  ]);
});
