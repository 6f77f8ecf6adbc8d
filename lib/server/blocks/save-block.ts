import 'server-only';
import { and, count, eq } from 'drizzle-orm';
import { block } from '@/db/schema/camp';
import { CAMP_LIMITS } from '@/lib/domain/camp/camp-limits';
import type { Id } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { BlockInput } from '@/lib/schemas/block';
import { editOwnCamp } from '../camps/edit-own-camp';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { newId } from '../new-id';

/** Adds a time of day to the grid, or changes one. Meetings that are placed keep their times. */
export function saveBlock(
  { campId, blockId, ...row }: BlockInput,
  context: Pick<Context, 'actor' | 'now'>,
): Result<{ blockId: Id<'blk'> }, Refusal> {
  return editOwnCamp(campId, context, (tx) => {
    const words = `${row.starts}–${row.ends}`;
    const rows = tx.select({ n: count() }).from(block).where(eq(block.campId, campId)).get()?.n ?? 0;
    if (blockId) {
      const own = and(eq(block.id, blockId), eq(block.campId, campId));
      if (tx.update(block).set(row).where(own).run().changes === 0) return refuse('not_found');
    } else if (rows >= CAMP_LIMITS.blocks)
      return refuse('bad_input', { sentence: `A day has at most ${CAMP_LIMITS.blocks} times.` });
    const id = blockId ?? newId('blk', context.now);
    if (!blockId)
      tx.insert(block)
        .values({ id, campId, ...row })
        .run();
    return ok({
      value: { blockId: id },
      action: blockId ? 'block.edit' : 'block.add',
      subjectId: id,
      sentence: blockId ? `Changed a time of day to ${words}.` : `Added the time of day ${words}.`,
    });
  });
}
