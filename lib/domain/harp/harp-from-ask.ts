import type { Harp } from './harp';
import type { HarpAsk } from './harp-ask';
import { harpFromLabel } from './harp-label';
import { positionRoot } from './position';

/** The harp that an ask means. Positions count from hole 1 in every tuning, whatever the cover says. */
export function harpFromAsk(ask: HarpAsk): Harp {
  if (ask.by === 'harp') return harpFromLabel(ask);
  return { root: positionRoot(ask.songKey.tonic, ask.position), tuning: ask.tuning, register: ask.register };
}
