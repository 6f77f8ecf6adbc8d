import 'server-only';
import { asc, eq } from 'drizzle-orm';
import { camp } from '@/db/schema/camp';
import { refund } from '@/db/schema/money';
import { order, orderLine } from '@/db/schema/order';
import type { OrderId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';

/** What the pages round paying show of an order. Permission is the caller's to check. Null when there is none. */
export function getCheckout(orderId: OrderId) {
  const db = getDb();
  const head = db
    .select({
      id: order.id,
      state: order.state,
      reference: order.reference,
      currency: order.currency,
      total: order.total,
      heldUntil: order.heldUntil,
      payerEmail: order.payerEmail,
      camp: { slug: camp.slug, name: camp.name, timeZone: camp.timeZone },
    })
    .from(order)
    .innerJoin(camp, eq(camp.id, order.campId))
    .where(eq(order.id, orderId))
    .get();
  if (!head) return null;
  return {
    ...head,
    lines: db
      .select()
      .from(orderLine)
      .where(eq(orderLine.orderId, orderId))
      .orderBy(asc(orderLine.position))
      .all(),
    refunds: db
      .select({ id: refund.id, amount: refund.amount, state: refund.state, reason: refund.reason })
      .from(refund)
      .where(eq(refund.orderId, orderId))
      .all(),
  };
}

export type Checkout = NonNullable<ReturnType<typeof getCheckout>>;
