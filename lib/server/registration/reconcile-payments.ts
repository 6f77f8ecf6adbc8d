import 'server-only';
import { and, asc, eq, inArray, lte } from 'drizzle-orm';
import { payment, refund } from '@/db/schema/money';
import type { OrderId } from '@/lib/domain/shared/ids';
import { getDb, inTransaction } from '../db';
import { getRefund } from '../payments/get-refund';
import { getSession } from '../payments/get-session';
import { applyRefund } from './apply-refund';
import { applySession } from './apply-session';
import { openPayment } from './open-payment';

/** Webhooks come within seconds; what is quiet for longer is asked about. */
const QUIET_FOR = 60_000;
const AT_ONCE = 20;

/** Asks the provider about payments and refunds that we have heard nothing of: repairs what lost webhooks left. */
export async function reconcilePayments(now: number): Promise<number> {
  const db = getDb();
  const quiet = db
    .select()
    .from(payment)
    .where(and(inArray(payment.state, ['opening', 'open']), lte(payment.updatedAt, now - QUIET_FOR)))
    .orderBy(asc(payment.updatedAt))
    .limit(AT_ONCE)
    .all();
  let repaired = 0;
  for (const row of quiet) {
    const outcome = await reconcilePayment(row, now);
    if (outcome === 'unavailable') return repaired;
    if (outcome === 'applied') repaired += 1;
  }
  const pending = db
    .select()
    .from(refund)
    .where(and(eq(refund.state, 'pending'), lte(refund.updatedAt, now - QUIET_FOR)))
    .orderBy(asc(refund.updatedAt))
    .limit(AT_ONCE)
    .all();
  for (const row of pending) {
    if (!row.providerRefundId) continue;
    const told = await getRefund(row.providerRefundId);
    // One that the provider does not know must not keep the others waiting.
    if (!told.ok && told.error === 'unavailable') break;
    inTransaction((tx) => {
      if (told.ok && applyRefund(tx, told.value, now).outcome === 'applied') repaired += 1;
      // Waits its turn again.
      else tx.update(refund).set({ updatedAt: now }).where(eq(refund.id, row.id)).run();
    });
  }
  return repaired;
}

async function reconcilePayment(
  row: typeof payment.$inferSelect,
  now: number,
): Promise<'applied' | 'no-news' | 'unavailable'> {
  const told = row.sessionId ? await getSession(row.sessionId) : await openPayment(row.id, now);
  if (!told.ok && told.error === 'unavailable') return 'unavailable';
  return inTransaction((tx) => {
    if (told.ok && applySession(tx, told.value, now).outcome === 'applied') return 'applied';
    // Waits its turn again.
    tx.update(payment).set({ updatedAt: now }).where(eq(payment.id, row.id)).run();
    return 'no-news';
  });
}

/** A page loaded over and over asks the provider no more often than this. */
const ASK_AGAIN_AFTER = 2_000;

/** The same for one order, at once: for the page that a payer comes back to before the webhook. */
export async function reconcileOrder(orderId: OrderId, now: number): Promise<void> {
  const live = getDb()
    .select()
    .from(payment)
    .where(
      and(
        eq(payment.orderId, orderId),
        inArray(payment.state, ['opening', 'open']),
        lte(payment.updatedAt, now - ASK_AGAIN_AFTER),
      ),
    )
    .all();
  for (const row of live) await reconcilePayment(row, now);
}
