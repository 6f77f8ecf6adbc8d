import 'server-only';
import { eq } from 'drizzle-orm';
import type { MailKind } from '@/db/schema/mail';
import { order, registration } from '@/db/schema/order';
import type { MailFailure } from '@/lib/domain/mail/after-failure';
import { isId } from '@/lib/domain/shared/ids';
import { writeAudit } from '../audit/write-audit';
import type { Tx } from '../db';
import type { MailRow } from './lease-mail';

const LETTERS: Record<MailKind, string> = {
  verify: 'The mail to prove an address',
  'known-address': 'The mail about a known address',
  reset: 'The mail to reset a password',
  'account-changed': 'The mail about a changed account',
  invite: 'The invitation',
  'order-confirmed': 'The mail with the tickets',
  'packing-list': 'The mail with the packing list',
  'late-payment': 'The mail about a refund',
  'booking-link': 'The mail with the link to the booking',
};
const REASONS: Record<MailFailure, string> = {
  away: 'the mail server could not be reached for five days',
  refused: 'the mail server refused the address',
  broken: 'it could not be written',
};

/** Tells the organiser, in the camp's history, that somebody did not get a letter about a booking. */
export function noteUndelivered(tx: Tx, row: MailRow, failure: MailFailure, now: number): void {
  const about = findOrder(tx, row.payload);
  if (!about) return;
  writeAudit(tx, {
    organisationId: about.organisationId,
    campId: about.campId,
    actorUserId: null,
    action: 'mail.undelivered',
    subjectId: row.id,
    sentence: `${LETTERS[row.kind]} for booking ${about.reference} was not delivered: ${REASONS[failure]}. Check the address with the payer; the booking page has everything the mail would have said.`,
    now,
  });
}

function findOrder(tx: Tx, { orderId = '', registrationId = '' }: Record<string, string>) {
  const fields = { organisationId: order.organisationId, campId: order.campId, reference: order.reference };
  if (isId('ord', orderId)) return tx.select(fields).from(order).where(eq(order.id, orderId)).get();
  if (!isId('reg', registrationId)) return undefined;
  return tx
    .select(fields)
    .from(registration)
    .innerJoin(order, eq(order.id, registration.orderId))
    .where(eq(registration.id, registrationId))
    .get();
}
