import 'server-only';
import { and, asc, eq, ne } from 'drizzle-orm';
import { track } from '@/db/schema/camp';
import { refund } from '@/db/schema/money';
import { order, orderLine, registration } from '@/db/schema/order';
import type { PersonDetails } from '@/lib/domain/people/person-details';
import type { CampId, RegistrationId } from '@/lib/domain/shared/ids';
import { minor } from '@/lib/domain/shared/money';
import { getDb } from '../db';
import { paidSql } from '../orders/due-sql';
import { electivesOf, harpsOf } from './own-things';
import { peopleColumns } from './people-columns';

/** An attendee of this camp with their order, in six statements; null when the camp has no such registration. */
export function getPerson(campId: CampId, id: RegistrationId): PersonDetails | null {
  const db = getDb();
  const this_ = and(eq(registration.id, id), eq(registration.campId, campId));
  const row = db
    .select({
      ...peopleColumns,
      orderId: order.id,
      orderState: order.state,
      total: order.total,
      paid: paidSql,
      arrivedAt: registration.arrivedAt,
    })
    .from(registration)
    .innerJoin(order, eq(order.id, registration.orderId))
    .innerJoin(track, eq(track.id, registration.trackId))
    .where(this_)
    .get();
  if (!row || !this_) return null;
  const { orderId, ...person } = row;
  return {
    ...person,
    due: minor(row.due),
    paid: minor(row.paid),
    electives: electivesOf(this_).get(id) ?? [],
    harps: harpsOf(this_).get(id) ?? [],
    lines: db
      .select({
        id: orderLine.id,
        label: orderLine.label,
        quantity: orderLine.quantity,
        amount: orderLine.amount,
      })
      .from(orderLine)
      .where(eq(orderLine.orderId, orderId))
      .orderBy(asc(orderLine.position), asc(orderLine.id))
      .all(),
    others: db
      .select({ id: registration.id, name: registration.attendeeName, state: registration.state })
      .from(registration)
      .where(and(eq(registration.orderId, orderId), ne(registration.id, id)))
      .orderBy(asc(registration.attendeeSearch), asc(registration.id))
      .all(),
    refunds: db
      .select({ id: refund.id, amount: refund.amount, state: refund.state, reason: refund.reason })
      .from(refund)
      .where(eq(refund.orderId, orderId))
      .orderBy(asc(refund.createdAt), asc(refund.id))
      .all(),
  };
}
