import 'server-only';
import { eq } from 'drizzle-orm';
import {
  draft,
  order,
  registration,
  registrationHarp,
  registrationNeeds,
  registrationWorkshop,
} from '@/db/schema/order';
import type { CompleteAnswers } from '@/lib/domain/registration/answers';
import type { CampId, OrderId } from '@/lib/domain/shared/ids';
import { err, ok, type Result } from '@/lib/domain/shared/result';
import { type getDb, inTransaction, type Tx } from '../db';
import { hashToken, newToken } from '../hash-token';
import { newId } from '../new-id';
import { endHold } from './end-hold';

/**
 * Gives a held place back and makes a draft of its answers, to change them or to try again after the time ran out.
 * `paid` when money arrived first: then there is nothing to give back. Returns the draft's token.
 */
export async function reopenAnswers(
  orderId: OrderId,
  token: string | null,
  now: number,
): Promise<Result<string, 'paid' | 'payment_down' | 'not_payable'>> {
  const ended = await endHold(orderId, now);
  if (ended !== 'expired') return err(ended);
  return inTransaction((tx) => {
    const row = tx.select().from(order).where(eq(order.id, orderId)).get();
    const answers = row && answersOf(tx, orderId, row);
    if (!row || !answers) return err('not_payable');
    return ok(putAnswers(tx, row.campId, token, answers, now));
  });
}

function putAnswers(
  tx: Tx,
  campId: CampId,
  token: string | null,
  answers: CompleteAnswers,
  now: number,
): string {
  const own =
    token &&
    tx
      .select()
      .from(draft)
      .where(eq(draft.tokenHash, hashToken(token)))
      .get()
      ? token
      : newToken();
  const tokenHash = hashToken(own);
  tx.insert(draft)
    .values({ id: newId('dft', now), tokenHash, campId, answers, createdAt: now, updatedAt: now })
    .onConflictDoUpdate({
      target: [draft.tokenHash, draft.campId],
      set: { answers, orderId: null, updatedAt: now },
    })
    .run();
  return own;
}

function answersOf(
  tx: Tx | ReturnType<typeof getDb>,
  orderId: OrderId,
  row: typeof order.$inferSelect,
): CompleteAnswers | null {
  const person = tx.select().from(registration).where(eq(registration.orderId, orderId)).get();
  const needs =
    person &&
    tx.select().from(registrationNeeds).where(eq(registrationNeeds.registrationId, person.id)).get();
  // Purged after some weeks: then there is nothing to begin from.
  if (!person || !needs || needs.emergencyName === '') return null;
  const { consentAt, registrationId, consentText: _gone, ...kept } = needs;
  const other = row.payerName !== person.attendeeName || row.payerEmail !== person.attendeeEmail;
  return {
    who: {
      attendeeName: person.attendeeName,
      attendeeEmail: person.attendeeEmail,
      payer: other ? 'other' : 'attendee',
      payerName: other ? row.payerName : '',
      payerEmail: other ? row.payerEmail : '',
      minor: person.minor,
    },
    track: {
      trackId: person.trackId,
      electives: tx
        .select()
        .from(registrationWorkshop)
        .where(eq(registrationWorkshop.registrationId, registrationId))
        .all()
        .map(({ workshopId }) => workshopId),
    },
    harps: {
      harpIds: tx
        .select()
        .from(registrationHarp)
        .where(eq(registrationHarp.registrationId, registrationId))
        .all()
        .map(({ harpId }) => harpId),
    },
    needs: { ...kept, consent: consentAt !== null },
  };
}
