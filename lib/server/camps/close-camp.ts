import 'server-only';
import { eq } from 'drizzle-orm';
import { camp } from '@/db/schema/camp';
import type { CampId } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { editOwnCamp } from './edit-own-camp';

/** Ends the sale; the page stays, and so does every place that is taken. */
export function closeCamp(
  campId: CampId,
  context: Pick<Context, 'actor' | 'now'>,
): Result<{ campId: CampId }, Refusal> {
  return editOwnCamp(campId, context, (tx, own) => {
    if (own.state !== 'published')
      return refuse('stale', { sentence: 'The camp is not on sale, so there is nothing to close.' });
    tx.update(camp).set({ state: 'closed', closedAt: context.now }).where(eq(camp.id, campId)).run();
    return ok({ value: { campId }, action: 'camp.close', subjectId: campId, sentence: 'Closed the sale.' });
  });
}
