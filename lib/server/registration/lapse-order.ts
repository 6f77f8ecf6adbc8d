import 'server-only';
import { and, count, eq, inArray } from 'drizzle-orm';
import { payment } from '@/db/schema/money';
import { order, registration } from '@/db/schema/order';
import { requireTransition } from '@/lib/domain/registration/require-transition';
import type { OrderId } from '@/lib/domain/shared/ids';
import type { Tx } from '../db';

/**
 * Gives the places of a hold back, once its time is over and no payment can still arrive: never before the provider
 * has said of each session that it is over. False when it is not (or no longer) due.
 */
export function lapseOrder(tx: Tx, orderId: OrderId, now: number): boolean {
  const row = tx.select().from(order).where(eq(order.id, orderId)).get();
  if (row?.state !== 'held' || row.heldUntil === null || row.heldUntil > now) return false;
  const live = tx
    .select({ n: count() })
    .from(payment)
    .where(and(eq(payment.orderId, orderId), inArray(payment.state, ['opening', 'open'])))
    .get();
  if (live && live.n > 0) return false;
  tx.update(order)
    .set({ state: requireTransition(row.state, 'lapse'), updatedAt: now })
    .where(eq(order.id, orderId))
    .run();
  for (const person of tx.select().from(registration).where(eq(registration.orderId, orderId)).all())
    tx.update(registration)
      .set({ state: requireTransition(person.state, 'lapse'), updatedAt: now })
      .where(eq(registration.id, person.id))
      .run();
  return true;
}
