import 'server-only';
import { and, count, eq, inArray, max } from 'drizzle-orm';
import { campPicture, instructor, room, track } from '@/db/schema/camp';
import type { CampId } from '@/lib/domain/shared/ids';
import type { Db, Tx } from '../db';

/** The lists of a camp that have an order. */
export const ORDERED = {
  tracks: track,
  rooms: room,
  instructors: instructor,
  pictures: campPicture,
} as const;
export type OrderedList = keyof typeof ORDERED;

/** Where a new row goes, and how many there are. */
export function endOf(tx: Tx, list: OrderedList, campId: CampId): { position: number; rows: number } {
  const table = ORDERED[list];
  const row = tx
    .select({ last: max(table.position), rows: count() })
    .from(table)
    .where(eq(table.campId, campId))
    .get();
  return { position: (row?.last ?? 0) + 1, rows: row?.rows ?? 0 };
}

/** How many of these ids are rows of this camp: as many as were given, unless somebody sent a foreign one. */
export function countOwn(
  db: Db | Tx,
  list: 'tracks' | 'instructors',
  campId: CampId,
  ids: readonly string[],
): number {
  const table = ORDERED[list];
  const own = and(eq(table.campId, campId), inArray(table.id as typeof track.id, [...ids] as never[]));
  return db.select({ n: count() }).from(table).where(own).get()?.n ?? 0;
}
