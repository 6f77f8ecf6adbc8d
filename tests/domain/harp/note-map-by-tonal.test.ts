import { Interval, Note } from 'tonal';
import { describe, expect, test } from 'vitest';
import type { Harp } from '@/lib/domain/harp/harp';
import { harpFromLabel, harpLabel } from '@/lib/domain/harp/harp-label';
import { noteMap } from '@/lib/domain/harp/note-map';
import { PITCH_CLASSES } from '@/lib/domain/harp/pitch-class';
import { REGISTERS } from '@/lib/domain/harp/register';
import type { Tuning } from '@/lib/domain/harp/tuning';

/**
 * The same harps built a second way: by the `tonal` library, from intervals and note names, with bend depths copied
 * from the tables. Shares no number with the product's own layouts.
 */
const RICHTER_BLOW = '1P 3M 5P 8P 10M 12P 15P 17M 19P 22P';
const RICHTER_DRAW = '2M 5P 7M 9M 11P 13M 14M 16M 18P 20M';
const MINOR_BLOW = '1P 3m 5P 8P 10m 12P 15P 17m 19P 22P';

type Built = { blow: string; draw: string; depths: string };
const BUILT: Partial<Record<Tuning, Built>> = {
  richter: { blow: RICHTER_BLOW, draw: RICHTER_DRAW, depths: '1 2 3 1 0 1 0 1 1 2' },
  'paddy-richter': {
    blow: '1P 3M 6M 8P 10M 12P 15P 17M 19P 22P',
    draw: RICHTER_DRAW,
    depths: '1 2 1 1 0 1 0 1 1 2',
  },
  country: { blow: RICHTER_BLOW, draw: '2M 5P 7M 9M 11A 13M 14M 16M 18P 20M', depths: '1 2 3 1 1 1 0 1 1 2' },
  'major-7th': {
    blow: RICHTER_BLOW,
    draw: '2M 5P 7M 9M 11A 13M 14M 16M 18A 20M',
    depths: '1 2 3 1 1 1 0 1 0 2',
  },
  'natural-minor': {
    blow: MINOR_BLOW,
    draw: '2M 5P 7m 9M 11P 13M 14m 16M 18P 20M',
    depths: '1 3 2 1 1 1 1 0 1 2',
  },
  'harmonic-minor': {
    blow: MINOR_BLOW,
    draw: '2M 5P 7M 9M 11P 13m 14M 16M 18P 20m',
    depths: '1 3 3 1 1 0 0 0 1 3',
  },
  solo: {
    blow: '1P 3M 5P 8P 8P 10M 12P 15P 15P 17M 19P 22P',
    draw: '2M 4P 6M 7M 9M 11P 13M 14M 16M 18P 20M 21M',
    depths: '0 0 0 0 0 0 0 0 0 0 0 0',
  },
};

/** Hole 1 of the twelve standard keys, G lowest and F# highest (encyclopaedia, “Richter-tuned harmonica”). */
const HOLE_ONE = ['G3', 'Ab3', 'A3', 'Bb3', 'B3', 'C4', 'Db4', 'D4', 'Eb4', 'E4', 'F4', 'F#4'];
/** Minor harps are named after the usual minor keys, and hole 1 follows the label. */
const MINOR_ROOTS: Partial<Record<Tuning, Record<string, string>>> = {
  'harmonic-minor': { Db4: 'C#4', Ab3: 'G#3' },
  'natural-minor': { Db4: 'C#4' },
};
const OCTAVE = { low: '-8P', standard: '1P', high: '8P' } as const;
/** Degrees as bends are named: second flat, third flat, fourth sharp, sixth flat, seventh flat. */
const DEGREES = ['1P', '2m', '2M', '3m', '3M', '4P', '4A', '5P', '6m', '6M', '7m', '7M'];

const up = (note: string, interval: string): string => Note.transpose(note, interval);
const midiOf = (note: string): number => Note.midi(note) ?? Number.NaN;

/** A double accidental goes by its plain name. */
const readable = (note: string): string => (Math.abs(Note.get(note).alt) > 1 ? Note.simplify(note) : note);

function byDegree(root: string, target: number): string {
  const offset = target - midiOf(root);
  const octaves = Math.floor(offset / 12);
  let note = up(root, DEGREES[offset - octaves * 12] ?? '');
  for (let each = 0; each < octaves; each += 1) note = up(note, '8P');
  return Note.simplify(note);
}

const CASES = Object.entries(BUILT).flatMap(([tuning, built]) =>
  HOLE_ONE.flatMap((standard) => {
    const named = MINOR_ROOTS[tuning as Tuning]?.[standard] ?? standard;
    const pitchClass = PITCH_CLASSES.find((key) => Note.chroma(key) === Note.chroma(standard)) ?? 'C';
    return REGISTERS.map((register) => {
      const harp: Harp = { root: pitchClass, tuning: tuning as Tuning, register };
      return {
        name: `${harpLabel(harp)}, hole 1 ${named} ${register}`,
        harp,
        root: up(named, OCTAVE[register]),
        built,
      };
    });
  }),
);

describe('every key, tuning and register, built by tonal', () => {
  test('all are there', () => expect(CASES).toHaveLength(12 * 7 * 3));

  test.each(CASES)('$name', ({ harp, root, built }) => {
    const holes = noteMap(harp);
    for (const breath of ['blow', 'draw'] as const) {
      const expected = built[breath].split(' ').map((interval) => readable(up(root, interval)));
      expect(holes.map((hole) => hole[breath].note)).toEqual(expected);
      expect(holes.map((hole) => hole[breath].midi)).toEqual(expected.map(midiOf));
      holes.forEach((hole, at) => {
        expect(hole[breath].hz).toBeCloseTo(Note.freq(expected[at] ?? '') ?? Number.NaN, 2);
      });
    }
    built.depths.split(' ').forEach((depth, at) => {
      const hole = holes[at];
      const high = Math.max(hole?.blow.midi ?? 0, hole?.draw.midi ?? 0);
      const names = Array.from({ length: Number(depth) }, (_, i) => byDegree(root, high - i - 1));
      expect(hole?.bends.map(({ note }) => note)).toEqual(names);
      expect(hole?.bends.map(({ midi }) => midi)).toEqual(names.map(midiOf));
      if (harp.tuning !== 'solo') expect(hole?.overbend?.note).toBe(byDegree(root, high + 1));
    });
  });

  test('natural minor under Ebm is built on Ab, so its second hole is Cb', () => {
    const holes = noteMap(harpFromLabel({ labelKey: 'Eb', tuning: 'natural-minor', register: 'standard' }));
    expect(holes[1]?.blow.note).toBe(up('Ab3', Interval.fromSemitones(3)));
  });
});
