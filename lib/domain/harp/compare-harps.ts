import type { Harp } from './harp';
import { holeOneMidi } from './hole-one';
import { TUNINGS } from './tuning';

/** Pitch order, low to high, by hole 1; at the same pitch by tuning, the ordinary harp first. For `sort`. */
export const compareHarps = (a: Harp, b: Harp): number =>
  holeOneMidi(a) - holeOneMidi(b) || TUNINGS.indexOf(a.tuning) - TUNINGS.indexOf(b.tuning);
