import { harpId } from './harp-id';
import { harpFromLabel } from './harp-label';
import type { PitchClass } from './pitch-class';
import type { Register } from './register';
import type { Tuning } from './tuning';

type OwnedHarpsInput = {
  harpIds: readonly string[];
  /** The one chosen in the three lists, by the key on its cover; no key is none. */
  addKey?: PitchClass | undefined;
  addTuning: Tuning;
  addRegister: Register;
};

/** What the form of one's own harps says: the ticks, and the harp of the lists whichever button was pressed. */
export function ownedHarpIds({ harpIds, addKey, addTuning, addRegister }: OwnedHarpsInput): string[] {
  if (addKey === undefined) return [...new Set(harpIds)];
  const added = harpId(harpFromLabel({ labelKey: addKey, tuning: addTuning, register: addRegister }));
  return [...new Set<string>([...harpIds, added])];
}
