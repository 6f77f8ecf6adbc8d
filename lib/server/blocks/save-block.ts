import 'server-only';
import { and, asc, eq } from 'drizzle-orm';
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
    const rows = tx.select().from(block).where(eq(block.campId, campId)).orderBy(asc(block.starts)).all();
    const before = rows.find(({ id }) => id === blockId);
    if (blockId && !before) return refuse('not_found');
    // The grid has one row a start: of two blocks with the same start it would hide one.
    const same = rows.find(({ id, starts }) => id !== blockId && starts === row.starts);
    if (same) return refuse('bad_input', { fields: { starts: [takenWords(same)] } });
    if (blockId) {
      const own = and(eq(block.id, blockId), eq(block.campId, campId));
      tx.update(block).set(row).where(own).run();
    } else if (rows.length >= CAMP_LIMITS.blocks)
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

const takenWords = ({ starts, ends, label }: { starts: string; ends: string; label: string }): string =>
  `From: ${starts} is taken by ${label ? `${label}, ` : ''}${starts}–${ends}. Give another start, or change that one.`;
