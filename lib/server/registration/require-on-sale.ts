import 'server-only';
import type { CampPlaces } from '@/lib/domain/camp/places';
import { SALE_WORDS, saleState } from '@/lib/domain/registration/sale-state';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { Programme } from '@/lib/domain/timetable/programme';
import { findPublicCampId } from '../camps/get-public-camp';
import { loadProgramme } from '../camps/load-programme';
import { type Refusal, refuse } from '../errors';
import { countPlaces } from './count-places';

/** A camp that sells now, by its address, for the actions of the steps. */
export function requireOnSale(
  slug: string,
  now: number,
): Result<{ programme: Programme; places: CampPlaces }, Refusal> {
  const id = findPublicCampId(slug);
  const programme = id && loadProgramme(id);
  const places = id && countPlaces(id);
  if (!programme || !places) return refuse('not_found');
  const sale = saleState(programme.camp, now);
  if (sale !== 'open') return refuse('camp_closed', { sentence: SALE_WORDS[sale] });
  return ok({ programme, places });
}
