import type { OrderId, OrganisationId, UserId } from '../shared/ids';
import { type Actor, rolesIn } from './actor';
import { PERMISSIONS, type Permission, type PermissionRule } from './permissions';

/** The row that a permission is asked on, cut down to what decides. */
export type Target =
  | { organisationId: OrganisationId }
  | { orderId: OrderId; payerUserId: UserId | null; payerEmail: string }
  | null;

/**
 * Decides a permission. A staff rule needs a role in the owning organisation; an order is one's own by account, by a
 * proven address, or by a link. A missing target refuses. `provider` is never granted here: its signature is the proof.
 */
export function can(actor: Actor, permission: Permission, target: Target = null): boolean {
  const rule: PermissionRule = PERMISSIONS[permission];
  if (rule.who === 'anyone') return true;
  if (rule.who === 'provider') return false;
  if (rule.who === 'signed-in') return actor.user !== null;
  if (rule.who === 'own') return target !== null && 'orderId' in target && ownsOrder(actor, target);
  if (rule.who !== 'staff' || target === null || !('organisationId' in target)) return false;
  return rolesIn(actor, target.organisationId).some((role) => rule.roles.includes(role));
}

function ownsOrder(actor: Actor, order: Extract<Target, { orderId: OrderId }>): boolean {
  if (actor.orders.includes(order.orderId)) return true;
  if (!actor.user) return false;
  if (order.payerUserId === actor.user.id) return true;
  return actor.user.emailVerified && actor.user.email === order.payerEmail;
}
