import 'server-only';
import { and, eq, gt } from 'drizzle-orm';
import { mail } from '@/db/schema/mail';
import { order } from '@/db/schema/order';
import { inTransaction } from '../db';
import { enqueueMail } from '../mail/enqueue-mail';

const QUIET = 10 * 60_000;

/**
 * Mails the link of a booking again, to the address it was made with. Says nothing of whether there is one: the caller
 * gives one answer to all (ASVS 6.3.8). Asked again within ten minutes, it sends nothing more.
 */
export function sendBookingLink(given: { email: string; reference: string; now: number }): void {
  const { email, reference, now } = given;
  inTransaction((tx) => {
    const row = tx
      .select({ id: order.id, payerName: order.payerName, payerEmail: order.payerEmail })
      .from(order)
      .where(and(eq(order.reference, reference), eq(order.payerEmail, email)))
      .get();
    if (!row) return;
    const lately = tx
      .select({ id: mail.id })
      .from(mail)
      .where(
        and(eq(mail.kind, 'booking-link'), eq(mail.toEmail, row.payerEmail), gt(mail.createdAt, now - QUIET)),
      )
      .get();
    if (lately) return;
    enqueueMail(tx, {
      kind: 'booking-link',
      toName: row.payerName,
      toEmail: row.payerEmail,
      payload: { orderId: row.id },
      now,
    });
  });
}
