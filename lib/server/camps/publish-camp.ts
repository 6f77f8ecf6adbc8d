import 'server-only';
import { eq } from 'drizzle-orm';
import { camp } from '@/db/schema/camp';
import { mayPublish, publishChecklist } from '@/lib/domain/camp/publish-checklist';
import type { CampId } from '@/lib/domain/shared/ids';
import { localDay } from '@/lib/domain/shared/local-time';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { Refusal } from '../errors';
import { refuse } from '../errors';
import type { Context } from '../ladder';
import { editOwnCamp } from './edit-own-camp';
import { loadProgramme } from './load-programme';

/**
 * Puts a draft on sale, or a closed camp on sale again. The checklist is read anew inside the transaction: what the
 * page showed may be an hour old.
 */
export function publishCamp(
  campId: CampId,
  context: Pick<Context, 'actor' | 'now'>,
): Result<{ campId: CampId }, Refusal> {
  const { now } = context;
  return editOwnCamp(campId, context, (tx, own) => {
    if (own.state === 'published') return refuse('stale', { sentence: 'The camp is on sale already.' });
    const programme = loadProgramme(campId);
    if (!programme) return refuse('not_found');
    const items = publishChecklist(programme, localDay(now, own.timeZone));
    if (!mayPublish(items)) {
      const missing = items.flatMap((item) => (item.level === 'must' && item.missing ? [item.missing] : []));
      return refuse('not_ready', { sentence: `Not yet. ${missing.join(' ')}` });
    }
    tx.update(camp)
      .set({ state: 'published', publishedAt: own.publishedAt ?? now, closedAt: null })
      .where(eq(camp.id, campId))
      .run();
    const again = own.state === 'closed';
    return ok({
      value: { campId },
      action: again ? 'camp.reopen' : 'camp.publish',
      subjectId: campId,
      sentence: again ? 'Opened the sale again.' : 'Published the camp: it is on sale.',
    });
  });
}
