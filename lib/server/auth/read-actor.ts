import 'server-only';
import { type Actor, VISITOR } from '@/lib/domain/access/actor';
import { findSession } from './find-session';
import { listRoles } from './list-roles';
import { readOrderGrants, readRegistrationGrants } from './order-grants';

/** Who a browser's cookies say is asking. Roles come from the table each time, so a revoked one ends at once. */
export async function readActor(
  held: { session: string | undefined; orders: string | undefined },
  now: number,
): Promise<Actor> {
  const granted = {
    orders: readOrderGrants(held.orders),
    registrations: readRegistrationGrants(held.orders),
  };
  const found = held.session ? await findSession(held.session, now) : null;
  if (!found) return { ...VISITOR, ...granted };
  const { id, name, email, emailVerifiedAt } = found.user;
  return {
    user: { id, name, email, emailVerified: emailVerifiedAt !== null },
    roles: listRoles(id),
    ...granted,
  };
}
