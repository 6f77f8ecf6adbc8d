import 'server-only';
import { eq } from 'drizzle-orm';
import { draft, order } from '@/db/schema/order';
import type { Actor } from '@/lib/domain/access/actor';
import { currentAnswers } from '@/lib/domain/registration/current-answers';
import { type ElectiveClash, findElectiveClashes } from '@/lib/domain/registration/find-elective-clashes';
import { quoteRegistration } from '@/lib/domain/registration/quote-registration';
import { type PlaceRefusal, refusePlaces } from '@/lib/domain/registration/refuse-places';
import { type SaleState, saleState } from '@/lib/domain/registration/sale-state';
import { type AnswerStep, firstUnanswered, isComplete } from '@/lib/domain/registration/steps';
import type { CampId, OrderId } from '@/lib/domain/shared/ids';
import { err, ok, type Result } from '@/lib/domain/shared/result';
import { loadProgramme } from '../camps/load-programme';
import { inTransaction } from '../db';
import { env } from '../env';
import { confirmOrder } from './confirm-order';
import { countPlaces } from './count-places';
import { findDraft } from './find-draft';
import { insertOrder } from './insert-order';

export type HoldRefusal =
  | PlaceRefusal
  | { code: 'camp_closed'; sale: Exclude<SaleState, 'open'> | 'no_price' }
  | { code: 'clash'; clash: ElectiveClash }
  | { code: 'unanswered'; step: AnswerStep };

type User = NonNullable<Actor['user']>;

/**
 * Turns a browser's answers into an order that holds camp place, track place and elective seats, all or nothing, in
 * one immediate transaction. Pressed twice or in two tabs it finds the order it made. What costs nothing is
 * confirmed at once.
 */
export function holdPlaces(
  token: string | null,
  campId: CampId,
  user: User | null,
  now: number,
): Result<OrderId, HoldRefusal> {
  return inTransaction((tx) => {
    const known = findDraft(token, campId);
    if (known?.order) return ok(known.order.id);
    const programme = loadProgramme(campId);
    const left = countPlaces(campId);
    if (!programme || !left || !known) return err({ code: 'unanswered', step: 'who' });
    const sale = saleState(programme.camp, now);
    if (sale !== 'open') return err({ code: 'camp_closed', sale });
    const answers = currentAnswers(known.answers, programme);
    const step = firstUnanswered(answers);
    if (!isComplete(answers) || step !== 'check')
      return err({ code: 'unanswered', step: step === 'check' ? 'who' : step });
    const [clash] = findElectiveClashes(programme, answers.track);
    if (clash) return err({ code: 'clash', clash });
    const refusal = refusePlaces(left, [answers.track]);
    if (refusal) return err(refusal);
    const quote = quoteRegistration(programme, [answers.track.trackId]);
    if (!quote) return err({ code: 'camp_closed', sale: 'no_price' });

    const { who } = answers;
    const isOwnAddress = user?.emailVerified === true && user.email === who.attendeeEmail;
    const id = insertOrder(tx, {
      organisationId: programme.camp.organisationId,
      campId,
      payer: {
        userId: user?.id ?? null,
        name: who.payer === 'other' ? who.payerName : who.attendeeName,
        email: who.payer === 'other' ? who.payerEmail : who.attendeeEmail,
      },
      attendees: [{ userId: isOwnAddress ? (user?.id ?? null) : null, answers }],
      quote,
      refundTerms: programme.camp.refundTerms,
      heldUntil: now + env().HOLD_MINUTES * 60_000,
      now,
    });
    // The answers live in the order from here on; a draft keeps no second copy of somebody's health.
    tx.update(draft).set({ answers: {}, orderId: id, updatedAt: now }).where(eq(draft.id, known.id)).run();
    if (quote.total === 0) {
      const row = tx.select().from(order).where(eq(order.id, id)).get();
      if (row) confirmOrder(tx, row, 'confirm', now);
    }
    return ok(id);
  });
}
