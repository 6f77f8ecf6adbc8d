import 'server-only';
import { and, asc, eq, isNull } from 'drizzle-orm';
import { camp, track } from '@/db/schema/camp';
import { payment, receipt, refund } from '@/db/schema/money';
import { order, orderLine, registration, ticket } from '@/db/schema/order';
import { organisation } from '@/db/schema/organisation';
import type { OrderId } from '@/lib/domain/shared/ids';
import { type Db, getDb, type Tx } from '../db';
import { orderDue } from './order-due';

/**
 * An order as its payer may see it: what was booked, by whom, for how much, and what has been paid. Eight statements
 * whatever its size; null when there is none. Permission is the caller's to check. No health data.
 */
export function loadOrder(orderId: OrderId, db: Db | Tx = getDb()) {
  const head = db
    .select({
      order,
      organisation: { id: organisation.id, name: organisation.name, email: organisation.email },
      camp: {
        id: camp.id,
        slug: camp.slug,
        name: camp.name,
        startsOn: camp.startsOn,
        endsOn: camp.endsOn,
        timeZone: camp.timeZone,
        venueName: camp.venueName,
        venueAddress: camp.venueAddress,
        arrivalFrom: camp.arrivalFrom,
      },
    })
    .from(order)
    .innerJoin(camp, eq(camp.id, order.campId))
    .innerJoin(organisation, eq(organisation.id, order.organisationId))
    .where(eq(order.id, orderId))
    .get();
  if (!head) return null;
  const registrations = db
    .select({
      id: registration.id,
      attendeeName: registration.attendeeName,
      attendeeEmail: registration.attendeeEmail,
      minor: registration.minor,
      state: registration.state,
      arrival: registration.arrival,
      arrivedAt: registration.arrivedAt,
      trackName: track.name,
      ticket: { id: ticket.id, campId: ticket.campId, issuedAt: ticket.issuedAt },
    })
    .from(registration)
    .innerJoin(track, eq(track.id, registration.trackId))
    .leftJoin(ticket, and(eq(ticket.registrationId, registration.id), isNull(ticket.revokedAt)))
    .where(eq(registration.orderId, orderId))
    .orderBy(asc(registration.createdAt), asc(registration.id))
    .all();
  const lines = db
    .select({
      id: orderLine.id,
      label: orderLine.label,
      quantity: orderLine.quantity,
      unit: orderLine.unit,
      amount: orderLine.amount,
    })
    .from(orderLine)
    .where(eq(orderLine.orderId, orderId))
    .orderBy(asc(orderLine.position), asc(orderLine.id))
    .all();
  const receipts = db
    .select({
      id: receipt.id,
      number: receipt.number,
      amount: receipt.amount,
      currency: receipt.currency,
      issuedAt: receipt.issuedAt,
    })
    .from(receipt)
    .where(eq(receipt.orderId, orderId))
    .orderBy(asc(receipt.number))
    .all();
  const refunds = db
    .select({
      id: refund.id,
      amount: refund.amount,
      currency: refund.currency,
      state: refund.state,
      reason: refund.reason,
      createdAt: refund.createdAt,
    })
    .from(refund)
    .where(eq(refund.orderId, orderId))
    .orderBy(asc(refund.createdAt), asc(refund.id))
    .all();
  const open = db
    .select({ id: payment.id })
    .from(payment)
    .where(and(eq(payment.orderId, orderId), eq(payment.state, 'open')))
    .get();
  return {
    ...head,
    registrations,
    lines,
    receipts,
    refunds,
    due: orderDue(orderId, db).amount,
    paymentOpen: open !== undefined,
  };
}

export type OrderView = NonNullable<ReturnType<typeof loadOrder>>;
export type OrderPerson = OrderView['registrations'][number];
