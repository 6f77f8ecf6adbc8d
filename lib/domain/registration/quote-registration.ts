import type { TrackId } from '../shared/ids';
import { addMinor, type Minor, minor } from '../shared/money';
import type { Programme } from '../timetable/programme';

export type QuoteLine = { label: string; quantity: number; unit: Minor; amount: Minor };
export type Quote = { currency: string; lines: QuoteLine[]; total: Minor };

type Priced = Pick<Programme, 'tracks'> & { camp: Pick<Programme['camp'], 'name' | 'currency' | 'price'> };

/**
 * What the attendees of these tracks pay, one line each: the track's own price, else the camp's. Null while the
 * organiser has not set a price or where a track is not of this camp. Prices come from here only, never from a form.
 */
export function quoteRegistration(programme: Priced, trackIds: readonly TrackId[]): Quote | null {
  const lines: QuoteLine[] = [];
  for (const trackId of trackIds) {
    const track = programme.tracks.find(({ id }) => id === trackId);
    const unit = track?.price ?? programme.camp.price;
    if (!track || unit === null || unit === undefined) return null;
    lines.push({ label: `${programme.camp.name}, ${track.name}`, quantity: 1, unit, amount: minor(unit) });
  }
  return {
    currency: programme.camp.currency,
    lines,
    total: addMinor(...lines.map(({ amount }) => amount)),
  };
}
