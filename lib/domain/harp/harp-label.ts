import type { Harp } from './harp';
import type { PitchClass } from './pitch-class';
import { transposeKey } from './pitch-class';
import type { Register } from './register';
import { songKeyName } from './song-key';
import { TUNING_FACTS, type Tuning } from './tuning';

/** What is printed on the cover: a key, a tuning, a register. */
export type HarpCover = { labelKey: PitchClass; tuning: Tuning; register: Register };

/** The key on the cover: of a natural minor the second position (hole 1 C → G, said "Gm"), else hole 1. */
export const labelKeyOf = ({ root, tuning }: Pick<Harp, 'root' | 'tuning'>): PitchClass =>
  transposeKey(root, TUNING_FACTS[tuning].labelAbove);

/** The harp under a cover: natural minor "Gm" → hole 1 is C. */
export const harpFromLabel = ({ labelKey, tuning, register }: HarpCover): Harp => ({
  root: transposeKey(labelKey, -TUNING_FACTS[tuning].labelAbove),
  tuning,
  register,
});

const REGISTER_WORD = { low: 'Low ', standard: '', high: 'High ' } satisfies Record<Register, string>;

/** The key as it stands on the cover, with the m of a minor tuning: `A`, `F#`, `Gm`. */
export const labelKeyName = (harp: Pick<Harp, 'root' | 'tuning'>): string =>
  songKeyName({ tonic: labelKeyOf(harp), minor: TUNING_FACTS[harp.tuning].minor });

/** `A`, `Low F`, `Gm natural minor`, `C chromatic`. */
export const harpLabel = (harp: Harp): string =>
  `${REGISTER_WORD[harp.register]}${labelKeyName(harp)} ${TUNING_FACTS[harp.tuning].suffix}`.trimEnd();
