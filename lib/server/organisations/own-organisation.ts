import 'server-only';
import { and, eq } from 'drizzle-orm';
import { organisation } from '@/db/schema/organisation';
import type { Actor } from '@/lib/domain/access/actor';
import type { Permission } from '@/lib/domain/access/permissions';
import type { OrganisationId } from '@/lib/domain/shared/ids';
import { ownedBy } from '../access/owned-by';
import { type Db, getDb, type Tx } from '../db';

export type OrganisationRow = typeof organisation.$inferSelect;

/** The organisation's row where the actor holds the permission on it, else null. */
export function ownOrganisation(
  actor: Actor,
  id: OrganisationId,
  permission: Permission,
  db: Db | Tx = getDb(),
): OrganisationRow | null {
  const row = db
    .select()
    .from(organisation)
    .where(and(eq(organisation.id, id), ownedBy(actor, permission, organisation.id)))
    .get();
  return row ?? null;
}
