import type { Programme } from '../timetable/programme';
import type { ChecklistItem } from './checklist-item';

/** What no place can be sold without; holds before publishing and for as long as the camp is on sale. */
export function saleItems({ camp, tracks }: Pick<Programme, 'camp' | 'tracks'>): ChecklistItem[] {
  const unpriced = tracks.filter(({ price }) => price === null);
  const priced = camp.price !== null || (tracks.length > 0 && unpriced.length === 0);
  const item = (
    code: string,
    title: string,
    mend: ChecklistItem['mend'],
    missing: string | false,
  ): ChecklistItem => ({ code, level: 'must', title, mend, missing: missing || null });
  return [
    item(
      'venue',
      'Venue',
      'details',
      (!camp.venueName || !camp.venueAddress) && 'Players need the venue’s name and its address.',
    ),
    item('price', 'Price', 'details', !priced && 'No price is set. A free camp has the price 0.'),
    item('capacity', 'Places', 'details', camp.capacity < 1 && 'The camp has 0 places, so it sells none.'),
    item(
      'refund-terms',
      'Refund terms',
      'details',
      !camp.refundTerms &&
        'Say until when how much comes back; each order keeps the words it was made under.',
    ),
    item(
      'tracks',
      'Tracks',
      'tracks',
      !tracks.some(({ capacity }) => capacity > 0) && 'There is no track with places to choose.',
    ),
  ];
}

/** The sentences of what is missing to sell; empty when nothing is. */
export const missingForSale = (programme: Pick<Programme, 'camp' | 'tracks'>): string[] =>
  saleItems(programme).flatMap(({ missing }) => (missing ? [missing] : []));
