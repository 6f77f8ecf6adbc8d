import 'server-only';
import { and, asc, eq, isNull } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { membership } from '@/db/schema/organisation';
import type { Actor } from '@/lib/domain/access/actor';
import { STAFF_ROLES, type StaffRole } from '@/lib/domain/access/roles';
import type { Id, OrganisationId, UserId } from '@/lib/domain/shared/ids';
import { ownedBy } from '../access/owned-by';
import { getDb } from '../db';

export type StaffPerson = {
  id: UserId;
  name: string;
  email: string;
  roles: { membershipId: Id<'mbr'>; role: StaffRole; since: number }[];
};

/** Who works for an organisation now, by name, each with their roles in the table's order. */
export function listStaff(actor: Actor, organisationId: OrganisationId): StaffPerson[] {
  const rows = getDb()
    .select({
      id: user.id,
      name: user.name,
      email: user.email,
      membershipId: membership.id,
      role: membership.role,
      since: membership.createdAt,
    })
    .from(membership)
    .innerJoin(user, eq(user.id, membership.userId))
    .where(
      and(
        eq(membership.organisationId, organisationId),
        isNull(membership.revokedAt),
        ownedBy(actor, 'staff.manage', membership.organisationId),
      ),
    )
    .orderBy(asc(user.name), asc(user.id))
    .all();
  const people = new Map<UserId, StaffPerson>();
  for (const { id, name, email, ...held } of rows) {
    const person = people.get(id) ?? { id, name, email, roles: [] };
    person.roles.push(held);
    person.roles.sort((a, b) => STAFF_ROLES.indexOf(a.role) - STAFF_ROLES.indexOf(b.role));
    people.set(id, person);
  }
  return [...people.values()];
}
