import 'server-only';
import { eq } from 'drizzle-orm';
import { camp } from '@/db/schema/camp';
import { order, registration } from '@/db/schema/order';
import { organisation } from '@/db/schema/organisation';
import type { Target } from '@/lib/domain/access/can';
import { isId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';

export type TargetKind = 'organisation' | 'camp' | 'order' | 'registration';

/** The row a permission is asked on, or null where the id is malformed or names nothing. */
export function findTarget(kind: TargetKind, id: string): Target {
  const db = getDb();
  if (kind === 'organisation' && isId('org', id)) {
    const row = db
      .select({ organisationId: organisation.id })
      .from(organisation)
      .where(eq(organisation.id, id))
      .get();
    return row ?? null;
  }
  if (kind === 'camp' && isId('cmp', id)) {
    const row = db.select({ organisationId: camp.organisationId }).from(camp).where(eq(camp.id, id)).get();
    return row ?? null;
  }
  if (kind === 'order' && isId('ord', id)) {
    const row = db
      .select({ orderId: order.id, payerUserId: order.payerUserId, payerEmail: order.payerEmail })
      .from(order)
      .where(eq(order.id, id))
      .get();
    return row ?? null;
  }
  if (kind === 'registration' && isId('reg', id)) {
    const row = db
      .select({
        registrationId: registration.id,
        attendeeUserId: registration.attendeeUserId,
        attendeeEmail: registration.attendeeEmail,
        order: { orderId: order.id, payerUserId: order.payerUserId, payerEmail: order.payerEmail },
      })
      .from(registration)
      .innerJoin(order, eq(order.id, registration.orderId))
      .where(eq(registration.id, id))
      .get();
    return row ?? null;
  }
  return null;
}
