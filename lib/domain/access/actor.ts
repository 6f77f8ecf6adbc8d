import type { OrderId, OrganisationId, RegistrationId, UserId } from '../shared/ids';
import type { StaffRole } from './roles';

/** Who is asking, read afresh for each request, so that a revoked role ends at once. */
export type Actor = {
  user: { id: UserId; name: string; email: string; emailVerified: boolean } | null;
  roles: readonly { organisationId: OrganisationId; role: StaffRole }[];
  /** Orders this browser may see by a link from the payer's mail or because it made them. */
  orders: readonly OrderId[];
  /** Registrations this browser may see by a link from the attendee's mail. */
  registrations: readonly RegistrationId[];
};

export const VISITOR: Actor = { user: null, roles: [], orders: [], registrations: [] };

export const rolesIn = (actor: Actor, organisationId: OrganisationId): StaffRole[] =>
  actor.roles.filter((held) => held.organisationId === organisationId).map((held) => held.role);
