import 'server-only';
import { and, desc, eq } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { camp, track } from '@/db/schema/camp';
import { scan } from '@/db/schema/door';
import { order, registration, registrationNeeds, ticket } from '@/db/schema/order';
import type { DoorPerson } from '@/lib/domain/door/decide-arrival';
import type { OrderId, RegistrationId, TicketId } from '@/lib/domain/shared/ids';
import type { Tx } from '../db';

export type FoundPerson = DoorPerson & {
  registrationId: RegistrationId;
  orderId: OrderId;
  name: string;
  trackName: string;
  campName: string;
  timeZone: string;
  minor: boolean;
  arrivedAt: number | null;
  /** There is a diet, access or health note; the door sees that, never what it says. */
  hasNeeds: boolean;
};

const columns = {
  registrationId: registration.id,
  orderId: order.id,
  campId: registration.campId,
  state: registration.state,
  arrival: registration.arrival,
  arrivedAt: registration.arrivedAt,
  name: registration.attendeeName,
  minor: registration.minor,
  trackName: track.name,
  campName: camp.name,
  timeZone: camp.timeZone,
  diet: registrationNeeds.diet,
  access: registrationNeeds.access,
  consentAt: registrationNeeds.consentAt,
};

/** The person behind a registration; null when there is none. Health details are cut down to a flag here. */
export function findByRegistration(tx: Tx, id: RegistrationId): FoundPerson | null {
  const row = tx
    .select(columns)
    .from(registration)
    .innerJoin(order, eq(order.id, registration.orderId))
    .innerJoin(track, eq(track.id, registration.trackId))
    .innerJoin(camp, eq(camp.id, registration.campId))
    .leftJoin(registrationNeeds, eq(registrationNeeds.registrationId, registration.id))
    .where(eq(registration.id, id))
    .get();
  if (!row) return null;
  const { diet, access, consentAt, ...rest } = row;
  return { ...rest, hasNeeds: Boolean(diet || access), consentMissing: row.minor && !consentAt };
}

/**
 * The person a ticket was issued to. A revoked ticket finds its person only where the place itself was given up, so
 * that the door can say cancelled; a ticket that another one replaced is not valid.
 */
export function findByTicket(tx: Tx, id: TicketId): FoundPerson | null {
  const row = tx
    .select({ registrationId: ticket.registrationId, revokedAt: ticket.revokedAt })
    .from(ticket)
    .where(eq(ticket.id, id))
    .get();
  const person = row && findByRegistration(tx, row.registrationId);
  if (!person) return null;
  return row.revokedAt !== null && person.state === 'confirmed' ? null : person;
}

/** Who marked the last arrival that still stands, by name; null when nobody has. */
export function arrivedBy(tx: Tx, id: RegistrationId): string | null {
  const row = tx
    .select({ name: user.name })
    .from(scan)
    .innerJoin(user, eq(user.id, scan.byUserId))
    .where(and(eq(scan.registrationId, id), eq(scan.verdict, 'arrived')))
    .orderBy(desc(scan.receivedAt))
    .get();
  return row?.name ?? null;
}
