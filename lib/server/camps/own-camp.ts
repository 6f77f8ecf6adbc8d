import 'server-only';
import { and, eq } from 'drizzle-orm';
import { camp } from '@/db/schema/camp';
import type { Actor } from '@/lib/domain/access/actor';
import type { Permission } from '@/lib/domain/access/permissions';
import type { CampId } from '@/lib/domain/shared/ids';
import { ownedBy } from '../access/owned-by';
import { type Db, getDb, type Tx } from '../db';

export type CampRow = typeof camp.$inferSelect;

/** The camp's row where the actor holds the permission on it, else null; for use inside a transaction. */
export function ownCamp(
  actor: Actor,
  campId: CampId,
  permission: Permission,
  db: Db | Tx = getDb(),
): CampRow | null {
  const row = db
    .select()
    .from(camp)
    .where(and(eq(camp.id, campId), ownedBy(actor, permission, camp.organisationId)))
    .get();
  return row ?? null;
}
