import 'server-only';
import { asc, eq, type SQL } from 'drizzle-orm';
import type { SQLiteColumn } from 'drizzle-orm/sqlite-core';
import { moveByOne } from '@/lib/domain/shared/move-by-one';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { MoveRowInput } from '@/lib/schemas/move';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { editOwnCamp } from './edit-own-camp';
import { ORDERED } from './own-rows';

const WORDS = { tracks: 'track', rooms: 'room', instructors: 'instructor', pictures: 'picture' } as const;

/** Moves a track, room, instructor or picture one place up or down; at the edge nothing happens. */
export function moveRow(
  { campId, list, id, towards }: MoveRowInput,
  context: Pick<Context, 'actor' | 'now'>,
): Result<{ moved: string }, Refusal> {
  return editOwnCamp(campId, context, (tx) => {
    const table = ORDERED[list];
    const is = (column: SQLiteColumn, value: string): SQL => eq(column, value);
    const ids = tx
      .select({ id: table.id })
      .from(table)
      .where(is(table.campId, campId))
      .orderBy(asc(table.position), asc(table.id))
      .all()
      .map((row): string => row.id);
    if (!ids.includes(id)) return refuse('not_found');
    for (const [at, rowId] of moveByOne(ids, id, towards).entries())
      tx.update(table)
        .set({ position: at + 1 })
        .where(is(table.id, rowId))
        .run();
    return ok({
      value: { moved: id },
      action: 'camp.order',
      subjectId: id,
      sentence: `Moved a ${WORDS[list]} ${towards}.`,
    });
  });
}
