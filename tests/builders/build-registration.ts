import type { Db } from '@/db/client';
import { order, registration, registrationNeeds, ticket } from '@/db/schema/order';
import { foldSearch } from '@/lib/domain/shared/fold-search';
import type {
  CampId,
  OrderId,
  OrganisationId,
  RegistrationId,
  TicketId,
  TrackId,
} from '@/lib/domain/shared/ids';
import { minor } from '@/lib/domain/shared/money';
import { NOW } from './build-camp';

type Given = {
  campId: CampId;
  organisationId: OrganisationId;
  trackId: TrackId;
  /** Tail of the order's, registration's and ticket's ids. */
  code?: string;
  name?: string;
  needs?: Partial<typeof registrationNeeds.$inferInsert>;
} & Partial<
  Pick<typeof registration.$inferInsert, 'state' | 'minor' | 'arrival' | 'attendeeEmail' | 'attendeeUserId'>
>;

/** One order with one registration, and a ticket where it is confirmed. Writes no money: see the books' own builder. */
export function buildRegistration(db: Db, given: Given) {
  const code = given.code ?? '1';
  const ids: { orderId: OrderId; registrationId: RegistrationId; ticketId: TicketId } = {
    orderId: `ord_${code}`,
    registrationId: `reg_${code}`,
    ticketId: `tkt_${code}`,
  };
  const name = given.name ?? 'Łucja Øverland';
  const state = given.state ?? 'confirmed';
  const email = given.attendeeEmail ?? `${code}@players.example`;
  const times = { createdAt: NOW, updatedAt: NOW };
  db.insert(order)
    .values({
      id: ids.orderId,
      organisationId: given.organisationId,
      campId: given.campId,
      reference: `REF${code}`,
      state,
      payerName: name,
      payerEmail: email,
      currency: 'EUR',
      total: minor(46_000),
      refundTerms: '',
      ...times,
    })
    .run();
  db.insert(registration)
    .values({
      id: ids.registrationId,
      orderId: ids.orderId,
      campId: given.campId,
      trackId: given.trackId,
      attendeeUserId: given.attendeeUserId ?? null,
      attendeeName: name,
      attendeeSearch: foldSearch(name),
      attendeeEmail: email,
      minor: given.minor ?? false,
      state,
      arrival: given.arrival ?? 'expected',
      ...times,
    })
    .run();
  db.insert(registrationNeeds)
    .values({ registrationId: ids.registrationId, ...given.needs })
    .run();
  if (state === 'confirmed')
    db.insert(ticket)
      .values({ id: ids.ticketId, registrationId: ids.registrationId, campId: given.campId, issuedAt: NOW })
      .run();
  return ids;
}
