import 'server-only';
import type { TrackAnswer } from '@/lib/domain/registration/answers';
import { type ElectiveClash, findElectiveClashes } from '@/lib/domain/registration/find-elective-clashes';
import { refusePlaces } from '@/lib/domain/registration/refuse-places';
import { ok, type Result } from '@/lib/domain/shared/result';
import { sayShortDay } from '@/lib/domain/shared/say-date';
import { type Refusal, refuse } from '../errors';
import { keepAnswer } from './keep-answer';
import { requireOnSale } from './require-on-sale';

/** Takes a track and electives of this camp that have places now and do not meet at the same time. */
export async function answerTrack(
  slug: string,
  track: TrackAnswer,
  now: number,
): Promise<Result<null, Refusal>> {
  const sale = requireOnSale(slug, now);
  if (!sale.ok) return sale;
  const { programme, places } = sale.value;
  const say = (fields: Record<string, string[]>) => refuse('bad_input', { fields });
  if (!programme.tracks.some(({ id }) => id === track.trackId))
    return say({ trackId: ['This camp does not have that track any more: choose one from the list.'] });
  const title = (id: string) =>
    programme.workshops.find((workshop) => workshop.id === id)?.title ?? 'One of them';
  const electives = programme.workshops.filter(({ audience }) => audience === 'elective').map(({ id }) => id);
  if (track.electives.some((id) => !electives.includes(id)))
    return say({
      electives: ['One of these is not an elective of this camp any more: choose from the list.'],
    });
  const full = refusePlaces(places, [track]);
  if (full?.code === 'track_full') return say({ trackId: ['This track is full: choose another one.'] });
  if (full?.code === 'elective_full')
    return say({ electives: [`${title(full.workshopId)} is full: take it out or choose another one.`] });
  const clashes = findElectiveClashes(programme, track);
  if (clashes.length > 0) return say({ electives: clashes.map(clashSentence) });
  await keepAnswer(programme.camp, { track }, now);
  return ok(null);
}

/** "Reed repair and Bending core both meet on Tue 9 June at 10:00: keep one of them." */
export const clashSentence = ({ title, other, day, starts }: ElectiveClash): string =>
  `${title} and ${other} meet at the same time (${sayShortDay(day)}, ${starts}): take ${title} out.`;
