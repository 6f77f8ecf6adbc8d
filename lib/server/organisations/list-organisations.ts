import 'server-only';
import { asc } from 'drizzle-orm';
import { organisation } from '@/db/schema/organisation';
import { type Actor, rolesIn } from '@/lib/domain/access/actor';
import { STAFF_ROLES, type StaffRole } from '@/lib/domain/access/roles';
import type { OrganisationId } from '@/lib/domain/shared/ids';
import { ownedBy } from '../access/owned-by';
import { getDb } from '../db';

/** The organisations in which the actor holds a role, by name, with those roles. */
export function listOrganisations(
  actor: Actor,
): { id: OrganisationId; name: string; email: string; roles: StaffRole[] }[] {
  return getDb()
    .select({ id: organisation.id, name: organisation.name, email: organisation.email })
    .from(organisation)
    .where(ownedBy(actor, 'organisation.read', organisation.id))
    .orderBy(asc(organisation.name), asc(organisation.id))
    .all()
    .map((row) => {
      const held = rolesIn(actor, row.id);
      return { ...row, roles: STAFF_ROLES.filter((role) => held.includes(role)) };
    });
}
