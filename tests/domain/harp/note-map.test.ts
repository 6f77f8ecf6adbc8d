import { describe, expect, test } from 'vitest';
import type { Harp } from '@/lib/domain/harp/harp';
import { harpFromLabel } from '@/lib/domain/harp/harp-label';
import { centsAbove, midiToHz, quarterWaveCm } from '@/lib/domain/harp/hz';
import { midi } from '@/lib/domain/harp/midi';
import { type HoleNotes, noteMap } from '@/lib/domain/harp/note-map';
import { parseHarpLabel } from '@/lib/domain/harp/parse-harp-label';
import { TUNINGS, type Tuning } from '@/lib/domain/harp/tuning';

function harp(label: string): Harp {
  const found = parseHarpLabel(label);
  if (!found) throw new Error(`The test names a harp that does not exist: ${label}`);
  return found;
}
const notes = (label: string, a4?: number): HoleNotes[] => noteMap(harp(label), a4);
const semitones = (label: string, breath: 'blow' | 'draw'): number[] => {
  const holes = notes(label);
  return holes.map((hole) => hole[breath].midi - (holes[0]?.blow.midi ?? 0));
};
const words = (text: string): string[] => text.trim().split(/\s+/);
const numbers = (text: string): number[] => words(text).map(Number);

describe('Richter layout', () => {
  test('semitones above hole 1, blow and draw in turn (OEIS A291810)', () => {
    const published = [0, 2, 4, 7, 7, 11, 12, 14, 16, 17, 19, 21, 24, 23, 28, 26, 31, 29, 36, 33];
    expect(notes('C').flatMap(({ blow, draw }) => [blow.midi - 60, draw.midi - 60])).toEqual(published);
  });

  test('19 different natural pitches (encyclopaedia, “Richter-tuned harmonica”)', () => {
    expect(new Set(notes('C').flatMap(({ blow, draw }) => [blow.midi, draw.midi])).size).toBe(19);
  });

  test('depth of bends by hole (mailing list, 1994-09: down to a semitone above the lower reed; common practice for 1–6)', () => {
    const depth = (breath: 'blow' | 'draw') =>
      notes('C').map(({ bends }) => bends.filter((bend) => bend.breath === breath).length);
    expect(depth('draw')).toEqual([1, 2, 3, 1, 0, 1, 0, 0, 0, 0]);
    expect(depth('blow')).toEqual([0, 0, 0, 0, 0, 0, 0, 1, 1, 2]);
  });

  test('overbends, one semitone above the higher reed (J. Acoust. Soc. Am. 103(4) 2134, abstract)', () => {
    const over = notes('C').map(({ overbend }) => overbend);
    expect(over.map((each) => (each?.midi ?? 0) - 60)).toEqual([3, 8, 12, 15, 18, 22, 25, 29, 32, 37]);
    expect(over.map((each) => each?.breath)).toEqual([...Array(6).fill('blow'), ...Array(4).fill('draw')]);
    expect(over.flatMap((each, index) => (each?.repeats ? [index + 1] : []))).toEqual([2, 3, 8]);
  });

  test('12 bent pitches; 31 of 37 semitones without overbends, all 37 with (computed with tonal, kept as numbers)', () => {
    const holes = notes('C');
    const bent = holes.flatMap(({ bends }) => bends);
    expect(bent.filter(({ breath }) => breath === 'draw')).toHaveLength(8);
    expect(bent.filter(({ breath }) => breath === 'blow')).toHaveLength(4);
    const sounded = new Set([
      ...holes.flatMap(({ blow, draw }) => [blow.midi - 60, draw.midi - 60]),
      ...bent.map((bend) => bend.midi - 60),
    ]);
    const missing = Array.from({ length: 37 }, (_, offset) => offset).filter(
      (offset) => !sounded.has(offset),
    );
    expect(missing).toEqual([3, 15, 18, 22, 25, 32]);
    const over = holes.map(({ overbend }) => (overbend?.midi ?? 0) - 60);
    expect(missing.filter((offset) => !over.includes(offset))).toEqual([]);
  });
});

/** Note tables computed with tonal; the frequencies of the next test agree with UNSW's published table. */
const TABLES = [
  {
    label: 'C',
    blow: 'C4 E4 G4 C5 E5 G5 C6 E6 G6 C7',
    draw: 'D4 G4 B4 D5 F5 A5 B5 D6 F6 A6',
    blowMidi: '60 64 67 72 76 79 84 88 91 96',
    drawMidi: '62 67 71 74 77 81 83 86 89 93',
  },
  {
    label: 'A',
    blow: 'A3 C#4 E4 A4 C#5 E5 A5 C#6 E6 A6',
    draw: 'B3 E4 G#4 B4 D5 F#5 G#5 B5 D6 F#6',
    blowMidi: '57 61 64 69 73 76 81 85 88 93',
    drawMidi: '59 64 68 71 74 78 80 83 86 90',
  },
  {
    label: 'G',
    blow: 'G3 B3 D4 G4 B4 D5 G5 B5 D6 G6',
    draw: 'A3 D4 F#4 A4 C5 E5 F#5 A5 C6 E6',
    blowMidi: '55 59 62 67 71 74 79 83 86 91',
    drawMidi: '57 62 66 69 72 76 78 81 84 88',
  },
];

describe('note tables', () => {
  test.each(TABLES)('$label harp', ({ label, blow, draw, blowMidi, drawMidi }) => {
    expect(notes(label).map((hole) => hole.blow.note)).toEqual(words(blow));
    expect(notes(label).map((hole) => hole.draw.note)).toEqual(words(draw));
    expect(notes(label).map((hole) => hole.blow.midi)).toEqual(numbers(blowMidi));
    expect(notes(label).map((hole) => hole.draw.midi)).toEqual(numbers(drawMidi));
  });

  test('bends of the C harp by name', () => {
    const bends = notes('C').flatMap(({ hole, bends: each }) =>
      each.map(({ depth, note }) => `${hole}${"'".repeat(depth)} ${note}`),
    );
    expect(bends).toEqual([
      "1' Db4",
      ...["2' F#4", "2'' F4"],
      ...["3' Bb4", "3'' A4", "3''' Ab4"],
      "4' Db5",
      "6' Ab5",
      "8' Eb6",
      "9' F#6",
      ...["10' B6", "10'' Bb6"],
    ]);
  });

  test('draw 3 of a B harp is A#; Wikibooks, “Harmonica Layouts and Alternate Tunings”, prints G#, which is a slip', () => {
    expect(notes('B')[2]?.draw).toMatchObject({ note: 'A#4', midi: 70 });
  });

  test('Cb4 is the pitch of B3 (59): the octave goes with the letter', () => {
    expect(notes('Ebm natural minor')[1]?.blow).toMatchObject({ note: 'Cb4', midi: 59 });
  });
});

test.each([
  // First and last note, from the free-reed section of an open-source notation program's instruments.xml.
  ['G', 55, 91],
  ['A', 57, 93],
  ['C', 60, 96],
  ['D', 62, 98],
  ['F', 65, 101],
  ['Low D', 50, 86],
  ['High G', 67, 103],
])('range of the %s harp: %i to %i', (label, first, last) => {
  const all = notes(label).flatMap(({ blow, draw }) => [blow.midi, draw.midi]);
  expect([Math.min(...all), Math.max(...all)]).toEqual([first, last]);
});

describe('pitch', () => {
  test.each([
    // UNSW, “Note names, MIDI numbers and frequencies”; two decimals as published.
    [55, 196.0],
    [57, 220.0],
    [60, 261.63],
    [66, 369.99],
    [69, 440.0],
    [84, 1046.5],
    [93, 1760.0],
    [96, 2093.0],
  ])('MIDI %i is %f Hz', (note, hz) => {
    expect(midiToHz(midi(note))).toBeCloseTo(hz, 2);
  });

  test('A4 at 443 Hz lies 11.76 cents above 440 (published harmonica tuning tables: makers tune sharp)', () => {
    expect(centsAbove(443, 440)).toBeCloseTo(11.76, 2);
    const [at440, at443] = [notes('A')[3]?.blow, notes('A', 443)[3]?.blow];
    expect(at443?.hz).toBe(443);
    expect(centsAbove(at443?.hz ?? 0, at440?.hz ?? 0)).toBeCloseTo(11.76, 2);
  });

  test.each([
    // Our own index, computed: target and quarter wavelength at 343 m/s.
    ['G', 2, 2, 262, 32.8],
    ['F', 2, 2, 466, 18.4],
    ['F', 10, 2, 2489, 3.4],
  ])('%s harp, hole %i bent %i: %i Hz, %f cm', (label, hole, depth, hz, cm) => {
    const bend = notes(label)[hole - 1]?.bends[depth - 1];
    expect(Math.round(bend?.hz ?? 0)).toBe(hz);
    expect(quarterWaveCm(bend?.hz ?? 0)).toBeCloseTo(cm, 1);
  });
});

describe('other tunings', () => {
  /** Depth tables worked out from the published changes by the rule of the 1994-09 mailing-list post. */
  const rows: [Tuning, string, string][] = [
    // Paddy Richter from memory; the rest after the encyclopaedia's “Richter tuning” and “Richter-tuned harmonica”.
    ['paddy-richter', '1 2 1 1 0 1', '0 1 1 2'],
    ['country', '1 2 3 1 1 1', '0 1 1 2'],
    ['major-7th', '1 2 3 1 1 1', '0 1 0 2'],
    ['natural-minor', '1 3 2 1 1 1', '1 0 1 2'],
    ['harmonic-minor', '1 3 3 1 1 0', '0 0 1 3'],
  ];
  test.each(rows)('depths of %s', (tuning, draw, blow) => {
    const holes = noteMap({ root: 'C', tuning, register: 'standard' });
    expect(
      holes.slice(0, 6).map(({ bends }) => bends.filter(({ breath }) => breath === 'draw').length),
    ).toEqual(numbers(draw));
    expect(holes.slice(6).map(({ bends }) => bends.filter(({ breath }) => breath === 'blow').length)).toEqual(
      numbers(blow),
    );
  });

  test('12-hole chromatic, slide a semitone up (encyclopaedia, “Solo tuning”)', () => {
    expect(semitones('C chromatic', 'blow')).toEqual([0, 4, 7, 12, 12, 16, 19, 24, 24, 28, 31, 36]);
    expect(semitones('C chromatic', 'draw')).toEqual([2, 5, 9, 11, 14, 17, 21, 23, 26, 29, 33, 35]);
    const [first] = notes('C chromatic');
    expect([first?.slide?.blow.note, first?.slide?.draw.note]).toEqual(['Db4', 'Eb4']);
    expect(notes('C chromatic').every(({ bends, overbend }) => bends.length === 0 && overbend === null)).toBe(
      true,
    );
  });

  test('only a tremolo has no note map, since makers lay it out differently (our own choice)', () => {
    const without = TUNINGS.filter(
      (tuning) => noteMap(harpFromLabel({ labelKey: 'C', tuning, register: 'standard' })).length === 0,
    );
    expect(without).toEqual(['tremolo']);
  });
});
