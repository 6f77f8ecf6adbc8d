import { noSuch } from './api-error';

type Range = { gt?: number; gte?: number; lt?: number; lte?: number };
export type ListParams = {
  limit?: number;
  starting_after?: string;
  ending_before?: string;
  created?: number | Range;
};

export function isWithin(at: number, created: ListParams['created']): boolean {
  if (created === undefined) return true;
  if (typeof created === 'number') return at === created;
  const { gt = -Infinity, gte = -Infinity, lt = Infinity, lte = Infinity } = created;
  return at > gt && at >= gte && at < lt && at <= lte;
}

/** One page of a list, newest first, by Stripe's cursors. `items` come oldest first and already filtered. */
export function listObjects<T extends { id: string }>(items: T[], params: ListParams, url: string) {
  const newest = [...items].reverse();
  const limit = params.limit ?? 10;
  const place = (id: string, param: string) => {
    const at = newest.findIndex((item) => item.id === id);
    if (at < 0) throw noSuch('object', id, param);
    return at;
  };
  if (params.ending_before !== undefined) {
    const end = place(params.ending_before, 'ending_before');
    const start = Math.max(0, end - limit);
    return { object: 'list' as const, data: newest.slice(start, end), has_more: start > 0, url };
  }
  const start = params.starting_after === undefined ? 0 : place(params.starting_after, 'starting_after') + 1;
  const data = newest.slice(start, start + limit);
  return { object: 'list' as const, data, has_more: start + limit < newest.length, url };
}
