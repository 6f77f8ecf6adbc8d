import { type PitchClass, pitchClassAt } from './pitch-class';

const LETTERS: Record<string, number> = { C: 0, D: 2, E: 4, F: 5, G: 7, A: 9, B: 11 };
const FLATS = ['b', '♭', 'flat'];
const SHARPS = ['#', '♯', 's', 'sharp'];

/**
 * Reads a key as a person types it, in either case: `Bb B♭ "B flat" F# F♯ Fs "F sharp"`. Enharmonic names meet (Gb, F♯
 * and Fs are all F#). Null when it is no key; so are As and Es, which are flats to a German reader.
 */
export function parsePitchClass(text: string): PitchClass | null {
  const match = /^([a-g])\s*(b|♭|flat|#|♯|(?<![ae])s|sharp)?$/i.exec(text.trim());
  const letter = LETTERS[match?.[1]?.toUpperCase() ?? ''];
  if (letter === undefined) return null;
  const accidental = match?.[2]?.toLowerCase() ?? '';
  if (FLATS.includes(accidental)) return pitchClassAt(letter - 1);
  if (SHARPS.includes(accidental)) return pitchClassAt(letter + 1);
  return pitchClassAt(letter);
}
