import 'server-only';
import { desc, eq, inArray, or, type SQL } from 'drizzle-orm';
import { camp, track } from '@/db/schema/camp';
import { order, registration } from '@/db/schema/order';
import type { Actor } from '@/lib/domain/access/actor';
import { getDb } from '../db';

/**
 * What the asker may see: orders they pay for, and places others booked for them. By account, by an address that the
 * account has proven, or by a link of a mail. Newest camp first; one statement.
 */
export function listOwnBookings(actor: Actor) {
  const proven = actor.user?.emailVerified ? actor.user.email : null;
  const isPayer = any([
    actor.user ? eq(order.payerUserId, actor.user.id) : null,
    proven ? eq(order.payerEmail, proven) : null,
    actor.orders.length > 0 ? inArray(order.id, [...actor.orders]) : null,
  ]);
  const attends = any([
    actor.user ? eq(registration.attendeeUserId, actor.user.id) : null,
    proven ? eq(registration.attendeeEmail, proven) : null,
    actor.registrations.length > 0 ? inArray(registration.id, [...actor.registrations]) : null,
  ]);
  if (!isPayer && !attends) return [];
  const db = getDb();
  // By keys found in indexes first: one condition over both joined tables would read every booking there is.
  const mine = or(
    isPayer && inArray(registration.orderId, db.select({ id: order.id }).from(order).where(isPayer)),
    attends && inArray(registration.id, db.select({ id: registration.id }).from(registration).where(attends)),
  );
  const rows = db
    .select({
      orderId: order.id,
      reference: order.reference,
      orderState: order.state,
      heldUntil: order.heldUntil,
      payerUserId: order.payerUserId,
      payerEmail: order.payerEmail,
      campName: camp.name,
      startsOn: camp.startsOn,
      endsOn: camp.endsOn,
      timeZone: camp.timeZone,
      venueName: camp.venueName,
      registrationId: registration.id,
      attendeeName: registration.attendeeName,
      attendeeUserId: registration.attendeeUserId,
      attendeeEmail: registration.attendeeEmail,
      state: registration.state,
      trackName: track.name,
    })
    .from(registration)
    .innerJoin(order, eq(order.id, registration.orderId))
    .innerJoin(camp, eq(camp.id, order.campId))
    .innerJoin(track, eq(track.id, registration.trackId))
    .where(mine)
    .orderBy(desc(camp.startsOn), desc(order.createdAt), registration.createdAt, registration.id)
    .all();
  const pays = (row: (typeof rows)[number]): boolean =>
    actor.orders.includes(row.orderId) ||
    (actor.user !== null && row.payerUserId === actor.user.id) ||
    (proven !== null && row.payerEmail === proven);
  const bookings = new Map<string, Booking>();
  for (const row of rows) {
    const { orderId, reference, orderState, heldUntil, campName, startsOn, endsOn, timeZone, venueName } =
      row;
    const booking = bookings.get(orderId) ?? {
      ...{ orderId, reference, state: orderState, heldUntil, mine: pays(row) },
      camp: { name: campName, startsOn, endsOn, timeZone, venueName },
      people: [],
    };
    const { registrationId: id, attendeeName, state, trackName } = row;
    booking.people.push({ id, attendeeName, state, trackName });
    bookings.set(orderId, booking);
  }
  return [...bookings.values()];
}

export type Booking = Pick<typeof order.$inferSelect, 'reference' | 'state' | 'heldUntil'> & {
  orderId: (typeof order.$inferSelect)['id'];
  /** Whether the asker pays, and so may open the order; else they are its attendee only. */
  mine: boolean;
  camp: Pick<typeof camp.$inferSelect, 'name' | 'startsOn' | 'endsOn' | 'timeZone' | 'venueName'>;
  people: (Pick<typeof registration.$inferSelect, 'id' | 'attendeeName' | 'state'> & { trackName: string })[];
};

const any = (parts: (SQL | null)[]): SQL | undefined => or(...parts.filter((part) => part !== null));
