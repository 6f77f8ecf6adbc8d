import 'server-only';
import { and, eq } from 'drizzle-orm';
import { track } from '@/db/schema/camp';
import { CAMP_LIMITS } from '@/lib/domain/camp/camp-limits';
import type { TrackId } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { TrackInput } from '@/lib/schemas/track';
import { editOwnCamp } from '../camps/edit-own-camp';
import { endOf } from '../camps/own-rows';
import { readPrice } from '../camps/read-price';
import { rowMark } from '../camps/row-mark';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { newId } from '../new-id';
import { countPlaces } from '../registration/count-places';

/** Adds a track at the end of the list, or changes one; never to fewer places than are taken. */
export function saveTrack(
  { campId, trackId, seen, ...input }: TrackInput,
  context: Pick<Context, 'actor' | 'now'>,
): Result<{ trackId: TrackId }, Refusal> {
  return editOwnCamp(campId, context, (tx, camp) => {
    const price = readPrice(input.price, camp.currency);
    if (!price.ok) return refuse('bad_input', { fields: { price: [price.error] } });
    const row = { ...input, price: price.value };
    const note = { action: trackId ? 'track.edit' : 'track.add' };
    if (!trackId) {
      const end = endOf(tx, 'tracks', campId);
      if (end.rows >= CAMP_LIMITS.tracks)
        return refuse('bad_input', { sentence: `A camp has at most ${CAMP_LIMITS.tracks} tracks.` });
      const id = newId('trk', context.now);
      tx.insert(track)
        .values({ id, campId, position: end.position, ...row })
        .run();
      return ok({ value: { trackId: id }, ...note, subjectId: id, sentence: `Added the track ${row.name}.` });
    }
    const own = and(eq(track.id, trackId), eq(track.campId, campId));
    const before = tx.select().from(track).where(own).get();
    if (!before) return refuse('not_found');
    if (seen && seen !== rowMark(before)) return refuse('stale');
    const taken = countPlaces(campId)?.tracks.find(({ id }) => id === trackId)?.places.taken;
    if (taken !== undefined && row.capacity < taken)
      return refuse('bad_input', {
        fields: {
          capacity: [
            `Places: ${row.capacity} is less than the ${taken} that are taken or held. Give ${taken} or more.`,
          ],
        },
      });
    tx.update(track).set(row).where(own).run();
    return ok({
      value: { trackId },
      ...note,
      subjectId: trackId,
      sentence: `Changed the track ${row.name}.`,
    });
  });
}
