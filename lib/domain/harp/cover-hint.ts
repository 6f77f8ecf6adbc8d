import type { Harp } from './harp';
import { labelKeyName } from './harp-label';
import type { Register } from './register';
import { rootName } from './root-name';
import { TUNING_FACTS, type Tuning } from './tuning';

const REGISTER_HINTS = {
  low: 'An octave below the ordinary harp of this key: look for “Low” on the cover.',
  standard: null,
  high: 'An octave above the ordinary harp of this key: look for “High” on the cover.',
} satisfies Record<Register, string | null>;

const TUNING_HINTS: Partial<Record<Tuning, string>> = {
  solo: 'A chromatic with twelve holes and a slide button.',
  tremolo: 'A tremolo: two reeds sound each note.',
};

/** What to look for on the cover, so that the right one goes into the bag; null for the ordinary harp. */
export function coverHint(harp: Harp): string | null {
  const { suffix, labelAbove } = TUNING_FACTS[harp.tuning];
  const tuning =
    TUNING_HINTS[harp.tuning] ??
    (suffix === '' ? null : `Look for “${labelKeyName(harp)}” and “${suffix}” on the cover.`);
  // Makers differ in the key they print, so the note itself settles it.
  const check =
    labelAbove === 0
      ? null
      : `Hole 1 blow sounds ${rootName(harp)}: check that note, some covers name it instead.`;
  return [REGISTER_HINTS[harp.register], tuning, check].filter(Boolean).join(' ') || null;
}
