import type { CoverItem } from './reduce-cover';

type Group = { options: CoverItem[]; mask: bigint }[];
type Best = { cost: bigint; ids: number[] };

const bit = (id: number): bigint => 1n << BigInt(id);

/** A quick first answer to beat: the narrowest open need takes the item that costs least for each need it serves. */
function firstAnswer(group: Group): Best {
  const best: Best = { cost: 0n, ids: [] };
  let open = group;
  while (open[0]) {
    const served = (item: CoverItem): bigint => BigInt(open.filter(({ mask }) => mask & bit(item.id)).length);
    const [first, ...rest] = open[0].options;
    if (!first) break;
    const item = rest.reduce((a, b) => (b.cost * served(a) < a.cost * served(b) ? b : a), first);
    best.cost += item.cost;
    best.ids.push(item.id);
    open = open.filter(({ mask }) => !(mask & bit(item.id)));
  }
  return best;
}

/** No answer can cost less: needs that share no item each pay for their cheapest one. */
function leastCost(open: Group, allowed: bigint): bigint {
  let used = 0n;
  let cost = 0n;
  for (const { options, mask } of open) {
    if (mask & allowed & used) continue;
    used |= mask & allowed;
    cost += options.reduce((least, item) => {
      if (!(bit(item.id) & allowed)) return least;
      return least === 0n || item.cost < least ? item.cost : least;
    }, 0n);
  }
  return cost;
}

/**
 * Branch and bound over each group. At the narrowest open need it tries each item in turn, and an item once tried is
 * out for its later siblings, so no set is met twice. Costs are all different (see `coverNeeds`): one best answer.
 */
export function searchCover(
  groups: readonly CoverItem[][][],
  maxNodes: number,
): { chosen: number[]; proven: boolean } {
  let nodes = 0;
  const solve = (lists: CoverItem[][]): number[] => {
    const group: Group = lists
      .map((options) => ({ options, mask: options.reduce((mask, { id }) => mask | bit(id), 0n) }))
      .sort((a, b) => a.options.length - b.options.length || (a.mask < b.mask ? -1 : 1));
    let best = firstAnswer(group);

    const branch = (open: Group, allowed: bigint, ids: number[], cost: bigint): void => {
      if (open.length === 0) {
        if (cost < best.cost) best = { cost, ids };
        return;
      }
      nodes += 1;
      if (nodes > maxNodes || cost + leastCost(open, allowed) >= best.cost) return;
      const choices = open
        .map(({ options }) => options.filter(({ id }) => bit(id) & allowed))
        .reduce((a, b) => (b.length < a.length ? b : a));
      let left = allowed;
      for (const item of choices) {
        const rest = open.filter(({ mask }) => !(mask & bit(item.id)));
        branch(rest, left, [...ids, item.id], cost + item.cost);
        left &= ~bit(item.id);
      }
    };
    branch(
      group,
      group.reduce((all, { mask }) => all | mask, 0n),
      [],
      0n,
    );
    return best.ids;
  };
  const chosen = groups.flatMap((lists) => solve(lists));
  return { chosen, proven: nodes <= maxNodes };
}
