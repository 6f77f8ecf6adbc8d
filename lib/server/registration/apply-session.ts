import 'server-only';
import { eq } from 'drizzle-orm';
import { payment } from '@/db/schema/money';
import type { Id } from '@/lib/domain/shared/ids';
import type { Tx } from '../db';
import type { ProviderSession } from '../payments/provider-session';
import { capturePayment } from './capture-payment';
import type { EventOutcome } from './event-outcome';
import { lapseOrder } from './lapse-order';

type PaymentRow = typeof payment.$inferSelect;

/**
 * Brings our rows in line with a session as the provider has it. The one way in for webhooks, the return page, the
 * sweep and the reconciliation, so that their order and number make no difference.
 */
export function applySession(tx: Tx, session: ProviderSession, now: number): EventOutcome {
  const row = findPayment(tx, session);
  if (!row) return { outcome: 'set-aside', reason: 'No payment of ours has this session.' };
  const wrong = mismatch(row, session);
  if (wrong) return { outcome: 'set-aside', reason: wrong, orderId: row.orderId };
  const done = (reason: string): EventOutcome => ({ outcome: 'applied', reason, orderId: row.orderId });
  const nothing = (reason: string): EventOutcome => ({ outcome: 'ignored', reason, orderId: row.orderId });

  if (row.state === 'captured') return nothing('The payment is captured already.');
  if (session.state === 'paid') {
    capturePayment(tx, row, { sessionId: session.id, intentId: session.intentId }, now);
    return done('Captured.');
  }
  if (row.state === 'expired') return nothing('The payment is over already.');
  if (session.state === 'expired') {
    tx.update(payment)
      .set({ state: 'expired', sessionId: session.id, url: null, updatedAt: now })
      .where(eq(payment.id, row.id))
      .run();
    return done(lapseOrder(tx, row.orderId, now) ? 'Over; the places went back.' : 'Over; the hold runs on.');
  }
  if (row.state === 'open') return nothing('Not paid yet.');
  tx.update(payment)
    .set({ state: 'open', sessionId: session.id, url: session.url, updatedAt: now })
    .where(eq(payment.id, row.id))
    .run();
  return done('Open.');
}

/** By the session; else by the payment we named in it, where we stopped before we could note the session. */
function findPayment(tx: Tx, session: ProviderSession): PaymentRow | undefined {
  const bySession = tx.select().from(payment).where(eq(payment.sessionId, session.id)).get();
  if (bySession) return bySession;
  const named = tx
    .select()
    .from(payment)
    .where(eq(payment.id, session.paymentId as Id<'pay'>))
    .get();
  return named?.sessionId === null ? named : undefined;
}

function mismatch(row: PaymentRow, session: ProviderSession): string | null {
  if (session.orderId !== row.orderId) return 'The session names another order.';
  if (session.currency !== row.currency || session.amount !== row.amount)
    return `The session is over ${session.amount} ${session.currency} minor units, the payment over ${row.amount} ${row.currency}.`;
  return null;
}
