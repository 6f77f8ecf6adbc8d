import 'server-only';
import { and, asc, eq, isNull, lte, or, sql } from 'drizzle-orm';
import { mail } from '@/db/schema/mail';
import { inTransaction } from '../db';

export type MailRow = typeof mail.$inferSelect;

// Longer than any send can take with the transport's timeouts, so that a slow one is not taken for a dead one.
const LEASE = 3 * 60_000;

/**
 * Takes the next due row for this runner, so that two of them never hold the same one. The attempt is counted here:
 * a letter that brings the process down is counted too. Null when nothing is due.
 */
export function leaseMail(now: number): MailRow | null {
  return inTransaction((tx) => {
    const due = tx
      .select({ id: mail.id })
      .from(mail)
      .where(
        and(
          eq(mail.state, 'queued'),
          lte(mail.nextAttemptAt, now),
          or(isNull(mail.leasedUntil), lte(mail.leasedUntil, now)),
        ),
      )
      .orderBy(asc(mail.nextAttemptAt), asc(mail.id))
      .limit(1)
      .get();
    if (!due) return null;
    return tx
      .update(mail)
      .set({ leasedUntil: now + LEASE, attempts: sql`${mail.attempts} + 1` })
      .where(eq(mail.id, due.id))
      .returning()
      .get();
  });
}
