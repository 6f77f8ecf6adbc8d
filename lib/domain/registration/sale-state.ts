import type { CampState } from '../camp/camp-words';
import { localDay } from '../shared/local-time';

/** open: sells · draft: not shown yet · closed: by the organiser · begun: the first day is over, where the camp is. */
export type SaleState = 'open' | 'draft' | 'closed' | 'begun';

/** Places are sold until the end of the camp's first day in its own zone, so that a late arrival can still register. */
export function saleState(
  camp: { state: CampState; startsOn: string; timeZone: string },
  now: number,
): SaleState {
  if (camp.state === 'draft') return 'draft';
  if (camp.state === 'closed') return 'closed';
  return localDay(now, camp.timeZone) > camp.startsOn ? 'begun' : 'open';
}

export const SALE_WORDS = {
  open: 'Open for registration.',
  draft: 'This camp is not published yet.',
  closed: 'Registration for this camp is closed.',
  begun: 'This camp has begun, so registration is over.',
} satisfies Record<SaleState, string>;
