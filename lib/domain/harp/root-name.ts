import type { Harp } from './harp';
import { labelKeyOf } from './harp-label';
import { minorName } from './song-key';
import { TUNING_FACTS } from './tuning';

/** Roots whose name differs in a minor tuning, so that root and label agree: C#m and G#m, but Ebm over Ab. */
const UNDER_LABEL: Record<string, string> = { 'C#': 'F#', 'G#': 'C#', Eb: 'Ab' };

/** How hole 1 blow is named: `Db` on a Db harp, `C#` on a C#m harmonic minor and on a G#m natural minor. */
export function rootName({ root, tuning }: Pick<Harp, 'root' | 'tuning'>): string {
  const { minor, labelAbove } = TUNING_FACTS[tuning];
  if (!minor) return root;
  if (labelAbove === 0) return minorName(root);
  return UNDER_LABEL[minorName(labelKeyOf({ root, tuning }))] ?? root;
}
