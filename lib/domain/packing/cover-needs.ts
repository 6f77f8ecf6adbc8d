import { type Cover, type CoverItem, reduceCover } from './reduce-cover';
import { searchCover } from './search-cover';

/**
 * Chooses items so that each need has at least one: the least total weight, and among equals the set whose first
 * difference comes earliest in item order, so there is one answer whatever the order of needs. Exact while the search
 * stays within `maxNodes`; beyond that `proven` is false and the answer is a cover, but perhaps not the lightest.
 * Needs list item numbers, weights are whole and above 0. A need without items throws: nothing can cover it.
 */
export function coverNeeds(
  needs: readonly (readonly number[])[],
  weights: readonly number[],
  maxNodes = 20_000,
): { chosen: number[]; proven: boolean } {
  const size = BigInt(weights.length);
  // One number ranks both: weight first, then a bonus that is larger the earlier the item, all bonuses below one weight.
  const items: CoverItem[] = weights.map((weight, id) => ({
    id,
    cost: (BigInt(weight) << size) - (1n << (size - 1n - BigInt(id))),
  }));
  const { forced, open }: Cover = reduceCover(needs, items);
  const found = searchCover(open, maxNodes);
  return {
    chosen: withoutIdle(needs, [...forced, ...found.chosen]).sort((a, b) => a - b),
    proven: found.proven,
  };
}

/** Drops items that the others make needless, the least preferred first. Changes nothing in a proven answer. */
function withoutIdle(needs: readonly (readonly number[])[], chosen: readonly number[]): number[] {
  const kept = new Set(chosen);
  for (const id of [...chosen].sort((a, b) => b - a)) {
    kept.delete(id);
    if (!needs.every((need) => need.some((item) => kept.has(item)))) kept.add(id);
  }
  return [...kept];
}
