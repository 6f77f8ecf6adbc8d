/** A thing that can be chosen, with the one number that ranks it; no two items cost the same. */
export type CoverItem = { id: number; cost: bigint };

/** What must be in every best answer, and the groups of needs that are left, each with no item in common. */
export type Cover = { forced: number[]; open: CoverItem[][][] };

const subset = (inner: ReadonlySet<number>, outer: ReadonlySet<number>): boolean =>
  [...inner].every((value) => outer.has(value));

/** Drops a need that another, narrower one already settles. */
const withoutWider = (needs: Set<number>[]): Set<number>[] =>
  needs.filter(
    (need, index) =>
      !needs.some(
        (other, at) => at !== index && subset(other, need) && (other.size < need.size || at < index),
      ),
  );

/** Drops an item when a cheaper one serves all that it serves: swapping it in never makes an answer worse. */
function withoutDominated(needs: Set<number>[], items: Map<number, CoverItem>): Set<number>[] {
  const serves = new Map<number, Set<number>>();
  needs.forEach((need, at) => {
    for (const id of need) serves.set(id, (serves.get(id) ?? new Set()).add(at));
  });
  const cost = (id: number): bigint => items.get(id)?.cost ?? 0n;
  const kept = [...serves.keys()].filter(
    (id) =>
      ![...serves.keys()].some(
        (other) =>
          other !== id &&
          cost(other) < cost(id) &&
          subset(serves.get(id) ?? new Set(), serves.get(other) ?? new Set()),
      ),
  );
  return needs.map((need) => new Set(kept.filter((id) => need.has(id))));
}

/** Needs that share items, directly or by way of others, belong together; the rest can be solved apart. */
function groups(needs: Set<number>[]): Set<number>[][] {
  const found: { ids: Set<number>; needs: Set<number>[] }[] = [];
  for (const need of needs) {
    const touching = found.filter(({ ids }) => [...need].some((id) => ids.has(id)));
    for (const group of touching) found.splice(found.indexOf(group), 1);
    found.push({
      ids: new Set([...need, ...touching.flatMap(({ ids }) => [...ids])]),
      needs: [need, ...touching.flatMap((group) => group.needs)],
    });
  }
  return found.map((group) => group.needs);
}

/** Takes what cannot be otherwise and drops what cannot matter, until neither changes anything. Loses no best answer. */
export function reduceCover(lists: readonly (readonly number[])[], all: readonly CoverItem[]): Cover {
  const items = new Map(all.map((item) => [item.id, item]));
  const forced = new Set<number>();
  let needs = lists.map((list) => new Set(list));
  if (needs.some((need) => need.size === 0))
    throw new RangeError('A need without any item cannot be covered.');
  for (let before = -1; before !== needs.reduce((sum, need) => sum + need.size, 0); ) {
    before = needs.reduce((sum, need) => sum + need.size, 0);
    needs = withoutDominated(withoutWider(needs), items);
    for (const need of needs) if (need.size === 1) for (const id of need) forced.add(id);
    needs = needs.filter((need) => ![...need].some((id) => forced.has(id)));
  }
  const open = groups(needs).map((group) =>
    group.map((need) => [...need].flatMap((id) => items.get(id) ?? [])),
  );
  return { forced: [...forced], open };
}
