import 'server-only';
import { and, count, eq } from 'drizzle-orm';
import { track } from '@/db/schema/camp';
import { registration } from '@/db/schema/order';
import { workshop, workshopTrack } from '@/db/schema/workshop';
import { listWords } from '@/lib/domain/shared/list-words';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { TrackRowInput } from '@/lib/schemas/track';
import { editOwnCamp } from '../camps/edit-own-camp';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';

/** Takes a track out; refused in words while workshops or registrations name it. */
export function deleteTrack(
  { campId, trackId }: TrackRowInput,
  context: Pick<Context, 'actor' | 'now'>,
): Result<{ deleted: string }, Refusal> {
  return editOwnCamp(campId, context, (tx) => {
    const own = and(eq(track.id, trackId), eq(track.campId, campId));
    const row = tx.select().from(track).where(own).get();
    if (!row) return refuse('not_found');
    const people =
      tx.select({ n: count() }).from(registration).where(eq(registration.trackId, trackId)).get()?.n ?? 0;
    if (people > 0)
      return refuse('in_use', {
        sentence: `${row.name} stays: ${people} ${people === 1 ? 'registration names' : 'registrations name'} it, cancelled ones included. To sell no more of it, set its places to what is taken.`,
      });
    const used = tx
      .select({ title: workshop.title })
      .from(workshopTrack)
      .innerJoin(workshop, eq(workshop.id, workshopTrack.workshopId))
      .where(eq(workshopTrack.trackId, trackId))
      .orderBy(workshop.title)
      .all();
    if (used.length > 0)
      return refuse('in_use', {
        sentence: `${row.name} stays: ${listWords(
          used.map(({ title }) => title),
          'and',
          3,
        )} ${used.length === 1 ? 'comes' : 'come'} with it. Take the track out there first.`,
      });
    tx.delete(track).where(own).run();
    return ok({
      value: { deleted: trackId },
      action: 'track.delete',
      subjectId: trackId,
      sentence: `Deleted the track ${row.name}.`,
    });
  });
}
