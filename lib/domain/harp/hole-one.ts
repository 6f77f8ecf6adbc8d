import type { Harp } from './harp';
import { type Midi, midi } from './midi';
import { pitchClassNumber } from './pitch-class';
import { REGISTER_SHIFT } from './register';

/** G is the lowest of the twelve standard keys and F# the highest, so the standard range runs G3 (55) to F#4 (66). */
const LOWEST = 55;
const G = 7;

/** The pitch of hole 1 blow. */
export const holeOneMidi = ({ root, register }: Pick<Harp, 'root' | 'register'>): Midi =>
  midi(LOWEST + ((pitchClassNumber(root) - G + 12) % 12) + REGISTER_SHIFT[register]);
