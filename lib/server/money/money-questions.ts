import 'server-only';
import { and, desc, eq, isNull, or } from 'drizzle-orm';
import { paymentEvent, refund } from '@/db/schema/money';
import { order } from '@/db/schema/order';
import type { MoneyQuestion } from '@/lib/domain/money/camp-money';
import type { CampId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';

const MOST = 100;

/**
 * What waits for a person: provider events that were set aside, and refunds that failed; newest first, two statements.
 * An event that names no order of ours belongs to no camp, so every camp's treasurer sees it: it carries no names.
 */
export function moneyQuestions(campId: CampId): MoneyQuestion[] {
  const db = getDb();
  const events = db
    .select({
      id: paymentEvent.id,
      at: paymentEvent.receivedAt,
      type: paymentEvent.type,
      why: paymentEvent.reason,
      reference: order.reference,
    })
    .from(paymentEvent)
    .leftJoin(order, eq(order.id, paymentEvent.orderId))
    .where(and(eq(paymentEvent.outcome, 'set-aside'), or(eq(order.campId, campId), isNull(order.id))))
    .orderBy(desc(paymentEvent.receivedAt))
    .limit(MOST)
    .all();
  const refunds = db
    .select({
      id: refund.id,
      at: refund.updatedAt,
      why: refund.reason,
      reference: order.reference,
      amount: refund.amount,
      currency: refund.currency,
    })
    .from(refund)
    .innerJoin(order, eq(order.id, refund.orderId))
    .where(and(eq(refund.state, 'failed'), eq(order.campId, campId)))
    .orderBy(desc(refund.updatedAt))
    .limit(MOST)
    .all();
  return [
    ...events.map(({ type, ...event }) => ({
      ...event,
      what: `Message from the payment provider (${type})`,
      amount: null,
    })),
    ...refunds.map(({ amount, currency, ...row }) => ({
      ...row,
      what: 'Refund failed; it is owed again',
      amount: { amount, currency },
    })),
  ].sort((a, b) => b.at - a.at);
}
