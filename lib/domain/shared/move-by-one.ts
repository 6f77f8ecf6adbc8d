/** The ids with one of them moved a place up or down; unchanged at the edge, or where the id is not among them. */
export function moveByOne<T extends string>(ids: readonly T[], id: T, towards: 'up' | 'down'): T[] {
  const from = ids.indexOf(id);
  const to = towards === 'up' ? from - 1 : from + 1;
  const moved = [...ids];
  const other = moved[to];
  if (from < 0 || other === undefined) return moved;
  moved[to] = id;
  moved[from] = other;
  return moved;
}
