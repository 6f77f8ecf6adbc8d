import type { Position } from './position';

/** The scale that the unbent notes of a Richter harp give in each position; null where its tonic needs a bend. */
export const POSITION_MODE = {
  1: 'Ionian',
  2: 'Mixolydian',
  3: 'Dorian',
  4: 'Aeolian',
  5: 'Phrygian',
  6: 'Locrian',
  7: null,
  8: null,
  9: null,
  10: null,
  11: null,
  12: 'Lydian',
} as const satisfies Record<Position, string | null>;

/** Positions players use for songs in a minor key on a Richter harp. */
export const MINOR_POSITIONS = [3, 4, 5] as const satisfies readonly Position[];
