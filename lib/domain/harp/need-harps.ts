import { compareHarps } from './compare-harps';
import type { Harp } from './harp';
import type { HarpNeed } from './harp-ask';
import { harpFromAsk } from './harp-from-ask';
import { harpId } from './harp-id';

/** The harps that meet a need, each once, in pitch order; none when any key will do. */
export const needHarps = ({ anyOf }: Pick<HarpNeed, 'anyOf'>): Harp[] =>
  [...new Map(anyOf.map(harpFromAsk).map((harp) => [harpId(harp), harp])).values()].sort(compareHarps);
