import 'server-only';
import { randomBytes } from 'node:crypto';
import { eq, sql } from 'drizzle-orm';
import {
  order,
  orderLine,
  registration,
  registrationHarp,
  registrationNeeds,
  registrationWorkshop,
} from '@/db/schema/order';
import { orderReference } from '@/lib/domain/orders/order-reference';
import { CONSENT_TEXT, type CompleteAnswers } from '@/lib/domain/registration/answers';
import type { Quote } from '@/lib/domain/registration/quote-registration';
import { foldSearch } from '@/lib/domain/shared/fold-search';
import type { CampId, OrderId, OrganisationId, UserId } from '@/lib/domain/shared/ids';
import { preparedOnce, type Tx } from '../db';
import { insertPrepared } from '../insert-prepared';
import { newId } from '../new-id';

export type NewOrder = {
  organisationId: OrganisationId;
  campId: CampId;
  payer: { userId: UserId | null; name: string; email: string };
  /** One entry an attendee, in the order of the quote's lines. */
  attendees: readonly { userId: UserId | null; answers: CompleteAnswers }[];
  quote: Quote;
  refundTerms: string;
  heldUntil: number;
  now: number;
};

/** Writes an order that holds its places, with everything that belongs to it. */
export function insertOrder(tx: Tx, given: NewOrder): OrderId {
  const { now, quote, payer } = given;
  const id = newId('ord', now);
  const stamp = { createdAt: now, updatedAt: now };
  insertPrepared(tx, order, {
    id,
    organisationId: given.organisationId,
    campId: given.campId,
    reference: freeReference(),
    state: 'held',
    payerUserId: payer.userId,
    payerName: payer.name,
    payerEmail: payer.email,
    currency: quote.currency,
    total: quote.total,
    refundTerms: given.refundTerms,
    heldUntil: given.heldUntil,
    ...stamp,
  });
  for (const [at, { answers, userId }] of given.attendees.entries()) {
    const { who, track, harps, needs } = answers;
    const registrationId = newId('reg', now);
    insertPrepared(tx, registration, {
      id: registrationId,
      orderId: id,
      campId: given.campId,
      trackId: track.trackId,
      attendeeUserId: userId,
      attendeeName: who.attendeeName,
      attendeeSearch: foldSearch(who.attendeeName),
      attendeeEmail: who.attendeeEmail,
      minor: who.minor,
      state: 'held',
      ...stamp,
    });
    const { consent, ...kept } = needs;
    // What a guardian said is kept for a minor only.
    const guardian = who.minor
      ? { consentAt: consent ? now : null, consentText: consent ? CONSENT_TEXT : '' }
      : { guardianName: '', guardianEmail: '', guardianPhone: '' };
    insertPrepared(tx, registrationNeeds, { registrationId, ...kept, ...guardian });
    for (const workshopId of track.electives)
      insertPrepared(tx, registrationWorkshop, { registrationId, workshopId });
    for (const harpId of harps.harpIds) insertPrepared(tx, registrationHarp, { registrationId, harpId });
    const line = quote.lines[at];
    if (!line) throw new Error('The quote has fewer lines than the order has attendees');
    insertPrepared(tx, orderLine, {
      id: newId('lin', now),
      orderId: id,
      registrationId,
      ...line,
      position: at + 1,
    });
  }
  return id;
}

const queries = preparedOnce((db) => ({
  taken: db
    .select({ id: order.id })
    .from(order)
    .where(eq(order.reference, sql.placeholder('reference')))
    .prepare(),
}));

function freeReference(): string {
  for (;;) {
    const reference = orderReference(randomBytes(24));
    if (reference && !queries().taken.get({ reference })) return reference;
  }
}
