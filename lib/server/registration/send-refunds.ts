import 'server-only';
import { and, asc, eq, lte } from 'drizzle-orm';
import { payment, refund } from '@/db/schema/money';
import { getDb, inTransaction } from '../db';
import { log } from '../log';
import { sendRefund } from '../payments/send-refund';
import { applyRefund } from './apply-refund';

const AT_ONCE = 20;
const FIRST_WAIT = 30_000;
const LONGEST_WAIT = 6 * 60 * 60_000;

/** Asks the provider for refunds that are owed. One that does not go is tried again, ever more slowly, and logged. */
export async function sendRefunds(now: number): Promise<number> {
  const owed = getDb()
    .select({ refund, intentId: payment.intentId })
    .from(refund)
    .innerJoin(payment, eq(payment.id, refund.paymentId))
    .where(and(eq(refund.state, 'owed'), lte(refund.nextAttemptAt, now)))
    .orderBy(asc(refund.nextAttemptAt))
    .limit(AT_ONCE)
    .all();
  let sent = 0;
  for (const { refund: row, intentId } of owed) {
    const answer = intentId
      ? await sendRefund({ refundId: row.id, orderId: row.orderId, intentId, amount: row.amount })
      : ({ ok: false, error: 'refused' } as const);
    inTransaction((tx) => {
      if (answer.ok) {
        applyRefund(tx, answer.value, now);
        return;
      }
      const attempts = row.attempts + 1;
      const nextAttemptAt = now + Math.min(LONGEST_WAIT, FIRST_WAIT * 2 ** attempts);
      tx.update(refund)
        .set({ attempts, nextAttemptAt, updatedAt: now })
        .where(and(eq(refund.id, row.id), eq(refund.state, 'owed')))
        .run();
    });
    if (answer.ok) sent += 1;
    else
      log.error(
        { refund: row.id, order: row.orderId, why: answer.error, attempts: row.attempts + 1 },
        'refund not sent',
      );
  }
  return sent;
}
