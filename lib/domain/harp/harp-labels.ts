import { compareHarps } from './compare-harps';
import { parseHarpId } from './harp-id';
import { harpLabel } from './harp-label';

/** Stored harp ids as their labels, lowest first; what names no harp is left out. */
export const harpLabels = (ids: readonly string[]): string[] =>
  ids
    .flatMap((id) => parseHarpId(id) ?? [])
    .sort(compareHarps)
    .map(harpLabel);
