import type { Actor } from '@/lib/domain/access/actor';
import type { StaffRole } from '@/lib/domain/access/roles';
import type { OrganisationId, UserId } from '@/lib/domain/shared/ids';

/** A signed-in actor with one role; no row behind it. The user row is `buildUser`'s where a foreign key needs it. */
export const staff = (
  role: StaffRole,
  organisationId: OrganisationId = 'org_1',
  id: UserId = `usr_${role}`,
): Actor => ({
  user: { id, name: role, email: `${role}@example.test`, emailVerified: true },
  roles: [{ organisationId, role }],
  orders: [],
  registrations: [],
});
