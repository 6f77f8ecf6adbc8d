import 'server-only';
import { eq } from 'drizzle-orm';
import { order, registration } from '@/db/schema/order';
import { requireTransition } from '@/lib/domain/registration/require-transition';
import type { RegistrationEvent } from '@/lib/domain/registration/transitions';
import { minor } from '@/lib/domain/shared/money';
import type { Tx } from '../db';
import { enqueueMail } from '../mail/enqueue-mail';
import { postLedger } from '../orders/post-ledger';
import { issueTicket } from '../tickets/issue-ticket';

type OrderRow = typeof order.$inferSelect;

/**
 * Everything that follows from an order being paid, in the transaction that takes the money: states, one ticket an
 * attendee, the sale in the ledger, and the mails in the outbox.
 */
export function confirmOrder(
  tx: Tx,
  row: OrderRow,
  event: Extract<RegistrationEvent, 'confirm' | 'seat-again'>,
  now: number,
): void {
  tx.update(order)
    .set({
      state: requireTransition(row.state, event),
      heldUntil: null,
      confirmedAt: now,
      updatedAt: now,
    })
    .where(eq(order.id, row.id))
    .run();
  const people = tx.select().from(registration).where(eq(registration.orderId, row.id)).all();
  for (const person of people) {
    tx.update(registration)
      .set({ state: requireTransition(person.state, event), updatedAt: now })
      .where(eq(registration.id, person.id))
      .run();
    issueTicket(tx, { registrationId: person.id, campId: person.campId, now });
  }
  postLedger(tx, {
    organisationId: row.organisationId,
    orderId: row.id,
    currency: row.currency,
    memo: 'Place sold',
    cause: row.id,
    entries: [
      { account: 'payers', amount: row.total },
      { account: 'income', amount: minor(-row.total) },
    ],
    now,
  });
  enqueueMail(tx, {
    kind: 'order-confirmed',
    toName: row.payerName,
    toEmail: row.payerEmail,
    payload: { orderId: row.id },
    now,
  });
  for (const person of people)
    enqueueMail(tx, {
      kind: 'packing-list',
      toName: person.attendeeName,
      toEmail: person.attendeeEmail,
      payload: { registrationId: person.id },
      now,
    });
}
