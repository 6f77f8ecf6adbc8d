import type { PitchClass } from './pitch-class';
import type { Register } from './register';
import type { Tuning } from './tuning';

/**
 * What a harp is: the note of hole 1 blow, the tuning and the register. The key printed on the cover is derived from
 * it (`labelKeyOf`) and is not always the root: a natural minor labelled Gm has C on hole 1.
 */
export type Harp = { root: PitchClass; tuning: Tuning; register: Register };

export const sameHarp = (a: Harp, b: Harp): boolean =>
  a.root === b.root && a.tuning === b.tuning && a.register === b.register;
