import 'server-only';
import type { Route } from 'next';
import { redirect } from 'next/navigation';
import { SALE_WORDS } from '@/lib/domain/registration/sale-state';
import { stepPath } from '@/lib/domain/registration/step-path';
import type { OrderId } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import { grantOrder } from '../auth/grant-order';
import { findPublicCampId } from '../camps/get-public-camp';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { readDraftToken } from './draft-cookie';
import { type HoldRefusal, holdPlaces } from './hold-places';

/** The button under the answers: holds the places and lets this browser see the order. */
export async function submitRegistration(slug: string, context: Context): Promise<Result<OrderId, Refusal>> {
  const campId = findPublicCampId(slug);
  if (!campId) return refuse('not_found');
  const held = holdPlaces(await readDraftToken(), campId, context.actor.user, context.now);
  if (!held.ok) return sendBack(slug, held.error);
  await grantOrder(held.value);
  return ok(held.value);
}

/** To the step that can put it right, which says what happened; what no step can put right is said on the spot. */
function sendBack(slug: string, refusal: HoldRefusal): { ok: false; error: Refusal } {
  switch (refusal.code) {
    case 'unanswered':
      return redirect(stepPath(slug, refusal.step) as Route);
    case 'track_full':
      return redirect(`${stepPath(slug, 'track', 'check')}&full=${refusal.trackId}` as Route);
    case 'elective_full':
      return redirect(`${stepPath(slug, 'track', 'check')}&full=${refusal.workshopId}` as Route);
    case 'clash':
      return redirect(`${stepPath(slug, 'track', 'check')}&clash=${refusal.clash.elective}` as Route);
    case 'camp_full':
      return refuse('camp_full');
    case 'camp_closed':
      return refuse('camp_closed', {
        sentence:
          refusal.sale === 'no_price' ? 'The price of this camp is not set yet.' : SALE_WORDS[refusal.sale],
      });
  }
}
