import type { Harp } from '../harp/harp';
import { harpId } from '../harp/harp-id';
import { coverNeeds } from './cover-needs';
import type { HarpSource } from './packing-list';
import { preferHarps } from './prefer-harps';

/**
 * The harps that meet all needs (each a list of alternatives, none empty) at the least cost: fewest to bring, then
 * fewest loaners, then fewest of one's own; ties by `preferHarps`. Order of needs and alternatives is irrelevant.
 */
export function chooseHarps(
  needs: readonly (readonly Harp[])[],
  sourceOf: (harp: Harp) => HarpSource,
): { harps: Harp[]; proven: boolean } {
  const all = [...new Map(needs.flat().map((harp) => [harpId(harp), harp])).values()].sort(preferHarps);
  const number = new Map(all.map((harp, index) => [harpId(harp), index]));
  // One harp to bring outweighs any number of loaners, one loaner any number of own harps.
  const step = all.length + 1;
  const weight = { owned: 1, loaner: step, bring: step * step } satisfies Record<HarpSource, number>;
  const { chosen, proven } = coverNeeds(
    needs.map((alternatives) => alternatives.flatMap((harp) => number.get(harpId(harp)) ?? [])),
    all.map((harp) => weight[sourceOf(harp)]),
  );
  return { harps: chosen.flatMap((index) => all[index] ?? []), proven };
}
