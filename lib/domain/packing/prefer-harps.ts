import type { Harp } from '../harp/harp';
import { holeOneMidi } from '../harp/hole-one';
import type { PitchClass } from '../harp/pitch-class';
import { TUNINGS } from '../harp/tuning';

/** The keys that people buy most (common practice): easier to own, borrow or find in a shop. */
const COMMON_KEYS: readonly PitchClass[] = ['G', 'A', 'Bb', 'C', 'D', 'E', 'F'];

/**
 * Which of two harps to name when either does equally well: the ordinary tuning, then the ordinary register, then a
 * common key, then the lower pitch. For `sort`; 0 only for the same harp.
 */
export const preferHarps = (a: Harp, b: Harp): number =>
  TUNINGS.indexOf(a.tuning) - TUNINGS.indexOf(b.tuning) ||
  Number(a.register !== 'standard') - Number(b.register !== 'standard') ||
  Number(!COMMON_KEYS.includes(a.root)) - Number(!COMMON_KEYS.includes(b.root)) ||
  holeOneMidi(a) - holeOneMidi(b);
