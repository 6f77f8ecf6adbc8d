import 'server-only';
import { and, eq } from 'drizzle-orm';
import { block } from '@/db/schema/camp';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { BlockRowInput } from '@/lib/schemas/block';
import { editOwnCamp } from '../camps/edit-own-camp';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';

/** Takes a time of day out of the grid; meetings that are placed keep their times. */
export function deleteBlock(
  { campId, blockId }: BlockRowInput,
  context: Pick<Context, 'actor' | 'now'>,
): Result<{ deleted: string }, Refusal> {
  return editOwnCamp(campId, context, (tx) => {
    const own = and(eq(block.id, blockId), eq(block.campId, campId));
    const row = tx.select().from(block).where(own).get();
    if (!row) return refuse('not_found');
    tx.delete(block).where(own).run();
    return ok({
      value: { deleted: blockId },
      action: 'block.delete',
      subjectId: blockId,
      sentence: `Deleted the time of day ${row.starts}–${row.ends}.`,
    });
  });
}
