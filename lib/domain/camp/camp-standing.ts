import { saleState } from '../registration/sale-state';
import { localDay } from '../shared/local-time';
import type { CampState } from './camp-words';

/** open: sells · full: would sell · closed: by the organiser · begun: running · past · draft: staff only. */
export type CampStanding = 'open' | 'full' | 'closed' | 'begun' | 'past' | 'draft';

/** What a visitor can do about a camp now. A track is its own smaller place: a camp with no track left is full. */
export function campStanding(
  camp: { state: CampState; startsOn: string; endsOn: string; timeZone: string },
  places: { camp: { left: number }; tracks: readonly { places: { left: number } }[] },
  now: number,
): CampStanding {
  const sale = saleState(camp, now);
  if (sale === 'draft') return 'draft';
  if (localDay(now, camp.timeZone) > camp.endsOn) return 'past';
  if (sale !== 'open') return sale;
  return placesLeft(places) > 0 ? 'open' : 'full';
}

/** Places that can be had: a camp has no more left than its tracks together. */
export const placesLeft = (places: {
  camp: { left: number };
  tracks: readonly { places: { left: number } }[];
}): number =>
  Math.min(
    places.camp.left,
    places.tracks.reduce((sum, track) => sum + track.places.left, 0),
  );
