import type { Midi } from './midi';

const LETTERS = 'CDEFGAB';
const NATURALS = [0, 2, 4, 5, 7, 9, 11] as const;
const SHARP_NAMES = ['C', 'C#', 'D', 'D#', 'E', 'F', 'F#', 'G', 'G#', 'A', 'A#', 'B'] as const;
const FLAT_NAMES = ['C', 'Db', 'D', 'Eb', 'E', 'F', 'Gb', 'G', 'Ab', 'A', 'Bb', 'B'] as const;

/** Letters above the root by semitones above it: second flat, second, third flat, third, fourth, fourth sharp, … */
const LETTER_STEPS = [0, 1, 1, 2, 2, 3, 3, 4, 5, 5, 6, 6] as const;

/** The name without letter tricks (no Cb, no double accidentals), as players say it. */
const plainName = (note: Midi, flat: boolean): string =>
  `${(flat ? FLAT_NAMES : SHARP_NAMES)[note % 12]}${Math.floor(note / 12) - 1}`;

/**
 * Names a note on a harp of the given root, by its degree: on an A harp 61 is C#4, on an Ab natural minor 59 is Cb4.
 * The octave goes with the letter (Cb4 is one below C4, so it is the pitch of B3). `keepLetter` false also turns Cb,
 * Fb, E# and B# into their plain names, as bends are named; double accidentals never appear.
 */
export function spellNote(root: string, semitonesAbove: number, note: Midi, keepLetter: boolean): string {
  const start = LETTERS.indexOf(root.charAt(0));
  const step = (start + (LETTER_STEPS[((semitonesAbove % 12) + 12) % 12] ?? 0)) % 7;
  const natural = NATURALS[step] ?? 0;
  // The octave in which the natural of this letter lies nearest to the note.
  const octave = Math.round((note - natural) / 12);
  const accidental = note - natural - octave * 12;
  const plain = plainName(note, accidental < 0);
  const isPlain = plain.length === 2 && accidental !== 0;
  if (Math.abs(accidental) > 1 || (isPlain && !keepLetter)) return plain;
  return `${LETTERS[step]}${{ '-1': 'b', 0: '', 1: '#' }[accidental]}${octave - 1}`;
}
