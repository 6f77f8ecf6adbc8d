import type { OrderId, OrganisationId, RegistrationId, UserId } from '../shared/ids';
import { type Actor, rolesIn } from './actor';
import { PERMISSIONS, type Permission, type PermissionRule } from './permissions';

type OrderTarget = { orderId: OrderId; payerUserId: UserId | null; payerEmail: string };
type RegistrationTarget = {
  registrationId: RegistrationId;
  order: OrderTarget;
  attendeeUserId: UserId | null;
  attendeeEmail: string;
};

/** The row that a permission is asked on, cut down to what decides. */
export type Target = { organisationId: OrganisationId } | OrderTarget | RegistrationTarget | null;

/**
 * Decides a permission. A staff rule needs a role in the owning organisation; an order is one's own by account, by a
 * proven address, or by a link; a registration with its order, or as its attendee. A missing target, or one of another
 * kind than the rule's, refuses. `provider` is never granted here: its signature is the proof.
 */
export function can(actor: Actor, permission: Permission, target: Target = null): boolean {
  const rule: PermissionRule = PERMISSIONS[permission];
  if (rule.who === 'anyone') return true;
  if (rule.who === 'provider') return false;
  if (rule.who === 'signed-in') return actor.user !== null;
  if (target === null) return false;
  if (rule.who === 'own') {
    if (rule.on === 'order') return 'orderId' in target && ownsOrder(actor, target);
    return 'registrationId' in target && (ownsOrder(actor, target.order) || attends(actor, target));
  }
  if (rule.who !== 'staff' || !('organisationId' in target)) return false;
  return rolesIn(actor, target.organisationId).some((role) => rule.roles.includes(role));
}

function ownsOrder(actor: Actor, order: OrderTarget): boolean {
  if (actor.orders.includes(order.orderId)) return true;
  return isPerson(actor, order.payerUserId, order.payerEmail);
}

const attends = (actor: Actor, registration: RegistrationTarget): boolean =>
  actor.registrations.includes(registration.registrationId) ||
  isPerson(actor, registration.attendeeUserId, registration.attendeeEmail);

/** By account, or by an address that the account has proven. */
function isPerson(actor: Actor, userId: UserId | null, email: string): boolean {
  if (!actor.user) return false;
  if (userId === actor.user.id) return true;
  return actor.user.emailVerified && actor.user.email === email.trim().toLowerCase();
}
