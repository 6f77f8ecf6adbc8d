import { compareHarps } from './compare-harps';
import { harpId } from './harp-id';
import { PITCH_CLASSES } from './pitch-class';

/** The twelve ordinary harps, low to high: ten holes, Richter, standard register. */
export const COMMON_HARPS = PITCH_CLASSES.map(
  (root) => ({ root, tuning: 'richter', register: 'standard' }) as const,
)
  .sort(compareHarps)
  .map(harpId);
