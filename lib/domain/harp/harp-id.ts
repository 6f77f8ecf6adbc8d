import type { Brand } from '../shared/brand';
import type { Harp } from './harp';
import { parsePitchClass } from './parse-pitch-class';
import { REGISTERS } from './register';
import { TUNINGS } from './tuning';

/** `C-richter-standard`, `Fs-natural-minor-low`. The key is the hole-1 root, never the label. */
export type HarpId = Brand<string, 'HarpId'>;

/** The one spelling of a harp in the database, in form values and in addresses; the sharp is an s, so no escaping. */
export const harpId = ({ root, tuning, register }: Harp): HarpId =>
  `${root.replace('#', 's')}-${tuning}-${register}` as HarpId;

/** Reads `harpId`'s spelling, and any enharmonic name of the root (`Gb-richter-low`). Null when it names no harp. */
export function parseHarpId(text: string): Harp | null {
  const match = /^([^-]+)-(.+)-([^-]+)$/.exec(text);
  const root = parsePitchClass(match?.[1] ?? '');
  const tuning = TUNINGS.find((name) => name === match?.[2]);
  const register = REGISTERS.find((name) => name === match?.[3]);
  return root && tuning && register ? { root, tuning, register } : null;
}
