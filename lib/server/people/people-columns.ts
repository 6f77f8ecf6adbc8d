import 'server-only';
import { track } from '@/db/schema/camp';
import { order, registration } from '@/db/schema/order';
import { dueSql } from '../orders/due-sql';

/** What a list of people reads of registration, order and track. Needs lie in a table of their own and are not here. */
export const peopleColumns = {
  id: registration.id,
  name: registration.attendeeName,
  minor: registration.minor,
  email: registration.attendeeEmail,
  trackId: registration.trackId,
  track: track.name,
  state: registration.state,
  arrival: registration.arrival,
  reference: order.reference,
  payer: order.payerName,
  payerEmail: order.payerEmail,
  due: dueSql,
  currency: order.currency,
  registeredAt: registration.createdAt,
};
