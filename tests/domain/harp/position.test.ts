import { Mode, Note } from 'tonal';
import { describe, expect, test } from 'vitest';
import { noteMap } from '@/lib/domain/harp/note-map';
import { PITCH_CLASSES, type PitchClass } from '@/lib/domain/harp/pitch-class';
import { POSITIONS, positionName, positionOf, positionRoot, positionTonic } from '@/lib/domain/harp/position';
import { MINOR_POSITIONS, POSITION_MODE } from '@/lib/domain/harp/position-mode';

const keys = (text: string): PitchClass[] => text.split(' ') as PitchClass[];

describe('harp for a song and a position', () => {
  test('a song in C, positions 1 to 12 (players’ mailing list, 2007-11)', () => {
    expect(POSITIONS.map((position) => positionRoot('C', position))).toEqual(
      keys('C F Bb Eb Ab Db F# B E A D G'),
    );
  });

  test.each([
    // Computed by harp = song − 7·(p − 1), song keys from C upwards; first five positions.
    [1, 'C Db D Eb E F F# G Ab A Bb B'],
    [2, 'F F# G Ab A Bb B C Db D Eb E'],
    [3, 'Bb B C Db D Eb E F F# G Ab A'],
    [4, 'Eb E F F# G Ab A Bb B C Db D'],
    [5, 'Ab A Bb B C Db D Eb E F F# G'],
  ] as const)('position %i', (position, row) => {
    expect(PITCH_CLASSES.map((song) => positionRoot(song, position))).toEqual(keys(row));
  });

  test.each([
    // Wikibooks, “Harmonica Layouts and Alternate Tunings”: major key of X, crossharp key of Y.
    ['C', 'G'],
    ['Db', 'Ab'],
    ['D', 'A'],
    ['E', 'B'],
    ['F', 'C'],
    ['G', 'D'],
    ['A', 'E'],
    ['B', 'F#'],
  ] as const)('%s harp, second position in %s', (harp, song) => {
    expect(positionRoot(song, 2)).toBe(harp);
    expect(positionTonic(harp, 2)).toBe(song);
    expect(positionOf(song, harp)).toBe(2);
  });

  test('second position of the seven natural-letter songs needs exactly D, E, F, G, A, Bb, C', () => {
    const harps = keys('C D E F G A B').map((song) => positionRoot(song, 2));
    expect(new Set(harps)).toEqual(new Set(keys('D E F G A Bb C')));
  });

  test('song, harp and position say the same whichever is asked for', () => {
    for (const song of PITCH_CLASSES)
      for (const position of POSITIONS) {
        const root = positionRoot(song, position);
        expect(positionTonic(root, position)).toBe(song);
        expect(positionOf(song, root)).toBe(position);
      }
  });

  test('names', () => {
    expect(POSITIONS.map(positionName).join(' ')).toBe('1st 2nd 3rd 4th 5th 6th 7th 8th 9th 10th 11th 12th');
  });
});

describe('modes', () => {
  test('1 Ionian, 2 Mixolydian, 3 Dorian, 4 Aeolian, 5 Phrygian, 6 Locrian, 12 Lydian (mailing list, 2006-02 and 2012-03)', () => {
    expect(POSITIONS.map((position) => POSITION_MODE[position])).toEqual([
      ...['Ionian', 'Mixolydian', 'Dorian', 'Aeolian', 'Phrygian', 'Locrian'],
      ...[null, null, null, null, null],
      'Lydian',
    ]);
  });

  test.each(PITCH_CLASSES)('the unbent notes of a Richter %s harp are those modes, by tonal', (root) => {
    const chromas = new Set(
      noteMap({ root, tuning: 'richter', register: 'standard' }).flatMap(({ blow, draw }) => [
        blow.midi % 12,
        draw.midi % 12,
      ]),
    );
    for (const position of POSITIONS) {
      const tonic = positionTonic(root, position);
      const mode = POSITION_MODE[position];
      if (mode)
        expect(new Set(Mode.notes(mode.toLowerCase(), tonic).map((note) => Note.chroma(note)))).toEqual(
          chromas,
        );
      else expect(chromas.has(Note.chroma(tonic) ?? -1)).toBe(false);
    }
  });

  test('minor songs in 3rd, 4th and 5th: Am takes G, C and F harps (mailing list, 2006-02)', () => {
    expect(MINOR_POSITIONS.map((position) => positionRoot('A', position))).toEqual(['G', 'C', 'F']);
  });
});
