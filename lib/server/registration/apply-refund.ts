import 'server-only';
import { eq } from 'drizzle-orm';
import { refund } from '@/db/schema/money';
import { order } from '@/db/schema/order';
import type { Id } from '@/lib/domain/shared/ids';
import { type Minor, minor } from '@/lib/domain/shared/money';
import type { Tx } from '../db';
import { type LedgerMemo, postLedger } from '../orders/post-ledger';
import type { ProviderRefund } from '../payments/provider-refund';
import type { EventOutcome } from './event-outcome';
import { oweRefund } from './owe-refund';

type RefundRow = typeof refund.$inferSelect;
// News that is older than what we know is passed over: a bank may still take back a success, nothing undoes a failure.
const RANK = { owed: 0, pending: 1, succeeded: 2, failed: 3 } as const;
const TRY_AGAIN_AFTER = 60 * 60_000;

/** Brings a refund in line with the provider's. One that failed is owed again, by a new row with a key of its own. */
export function applyRefund(tx: Tx, told: ProviderRefund, now: number): EventOutcome {
  const row =
    tx.select().from(refund).where(eq(refund.providerRefundId, told.id)).get() ??
    tx
      .select()
      .from(refund)
      .where(eq(refund.id, told.refundId as Id<'rfd'>))
      .get();
  if (!row) return { outcome: 'set-aside', reason: 'We did not ask for this refund.' };
  if (told.amount !== row.amount || told.currency !== row.currency)
    return {
      outcome: 'set-aside',
      reason: `The refund is over ${told.amount} ${told.currency} minor units, ours over ${row.amount} ${row.currency}.`,
      orderId: row.orderId,
    };
  if (RANK[told.state] <= RANK[row.state])
    return { outcome: 'ignored', reason: `It is ${row.state} already.`, orderId: row.orderId };
  tx.update(refund)
    .set({ state: told.state, providerRefundId: told.id, updatedAt: now })
    .where(eq(refund.id, row.id))
    .run();
  if (told.state === 'succeeded') post(tx, row, 'Refund', now);
  if (told.state === 'failed') {
    if (row.state === 'succeeded') post(tx, row, 'Refund came back', now);
    const { orderId, paymentId, amount, currency, reason } = row;
    oweRefund(tx, { orderId, paymentId, amount, currency, reason, from: now + TRY_AGAIN_AFTER, now });
  }
  return { outcome: 'applied', reason: `Refund ${told.state}.`, orderId: row.orderId };
}

function post(
  tx: Tx,
  row: RefundRow,
  memo: Extract<LedgerMemo, 'Refund' | 'Refund came back'>,
  now: number,
): void {
  const of = tx
    .select({ organisationId: order.organisationId })
    .from(order)
    .where(eq(order.id, row.orderId))
    .get();
  if (!of) throw new Error(`Refund ${row.id} has no order`);
  const out: Minor = memo === 'Refund' ? row.amount : minor(-row.amount);
  postLedger(tx, {
    ...of,
    orderId: row.orderId,
    currency: row.currency,
    memo,
    cause: row.id,
    entries: [
      { account: 'payers', amount: out },
      { account: 'provider', amount: minor(-out) },
    ],
    now,
  });
}
