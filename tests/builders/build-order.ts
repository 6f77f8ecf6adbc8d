import type { Db } from '@/db/client';
import { order, orderLine, registration } from '@/db/schema/order';
import type { RegistrationState } from '@/lib/domain/registration/states';
import type { CampId, OrderId, OrganisationId, RegistrationId, TrackId } from '@/lib/domain/shared/ids';
import { minor } from '@/lib/domain/shared/money';
import { NOW } from './build-camp';

/** An order with one registration (`reg_` and the order's tail, then a, b, …) for each name, in the given state. */
export function buildOrder(
  db: Db,
  given: {
    id?: OrderId;
    organisationId?: OrganisationId;
    campId?: CampId;
    trackId?: TrackId;
    state?: RegistrationState;
    payer?: Partial<Pick<typeof order.$inferInsert, 'payerName' | 'payerEmail' | 'payerUserId'>>;
    attendees?: string[];
    overrides?: Partial<typeof order.$inferInsert>;
  } = {},
): { orderId: OrderId; registrationIds: RegistrationId[] } {
  const orderId = given.id ?? 'ord_1';
  const campId = given.campId ?? 'cmp_1';
  const state = given.state ?? 'confirmed';
  const attendees = given.attendees ?? ['Noor Haddad'];
  const price = minor(46_000);
  db.insert(order)
    .values({
      id: orderId,
      organisationId: given.organisationId ?? 'org_1',
      campId,
      reference: `HARP${orderId.slice(4).toUpperCase().padStart(4, '2')}`,
      state,
      payerName: 'Noor Haddad',
      payerEmail: 'noor@example.test',
      currency: 'EUR',
      total: minor(price * attendees.length),
      refundTerms: 'Until 60 days before: all but 50 EUR.',
      heldUntil: state === 'held' ? NOW + 20 * 60_000 : null,
      confirmedAt: state === 'confirmed' ? NOW : null,
      createdAt: NOW,
      updatedAt: NOW,
      ...given.payer,
      ...given.overrides,
    })
    .run();
  const registrationIds = attendees.map((name, at): RegistrationId => {
    const letter = String.fromCharCode(97 + at);
    const id: RegistrationId = `reg_${orderId.slice(4)}${letter}`;
    db.insert(registration)
      .values({
        id,
        orderId,
        campId,
        trackId: given.trackId ?? `trk_${campId.slice(4)}b`,
        attendeeName: name,
        attendeeSearch: name.toLowerCase(),
        attendeeEmail: `${letter}@example.test`,
        minor: false,
        state,
        createdAt: NOW,
        updatedAt: NOW,
      })
      .run();
    db.insert(orderLine)
      .values({
        id: `lin_${orderId.slice(4)}${letter}`,
        orderId,
        registrationId: id,
        label: `Place for ${name}, Bending`,
        quantity: 1,
        unit: price,
        amount: price,
        position: at,
      })
      .run();
    return id;
  });
  return { orderId, registrationIds };
}
