import type { Harp } from './harp';
import { holeOneMidi } from './hole-one';

/** low: more air, bigger movements · high: less air, more finesse, bends harder to hit. */
export type EffortBand = 'low' | 'mid' | 'high';

/** By the pitch of hole 1: up to B3 (59) low, C4 to Eb4 (60–63) mid, from E4 (64) high. Our own bands. */
export function effortBand(harp: Harp): EffortBand {
  const pitch = holeOneMidi(harp);
  if (pitch < 60) return 'low';
  return pitch < 64 ? 'mid' : 'high';
}
