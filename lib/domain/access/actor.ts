import type { OrderId, OrganisationId, UserId } from '../shared/ids';
import type { StaffRole } from './roles';

/** Who is asking, read afresh for each request, so that a revoked role ends at once. */
export type Actor = {
  user: { id: UserId; name: string; email: string; emailVerified: boolean } | null;
  roles: readonly { organisationId: OrganisationId; role: StaffRole }[];
  /** Orders this browser may see by a link from the payer's mail or because it made them. */
  orders: readonly OrderId[];
};

export const VISITOR: Actor = { user: null, roles: [], orders: [] };

export const rolesIn = (actor: Actor, organisationId: OrganisationId): StaffRole[] =>
  actor.roles.filter((held) => held.organisationId === organisationId).map((held) => held.role);
