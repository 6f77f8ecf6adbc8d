import 'server-only';
import { and, asc, eq, isNull } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { membership } from '@/db/schema/organisation';
import type { OrganisationId, UserId } from '@/lib/domain/shared/ids';
import { type Db, getDb, type Tx } from '../db';

/** The accounts that an instructor of this organisation's camps may be linked to: those with the role, by name. */
export function listLinkable(
  organisationId: OrganisationId,
  db: Db | Tx = getDb(),
): { id: UserId; name: string; email: string }[] {
  return db
    .selectDistinct({ id: user.id, name: user.name, email: user.email })
    .from(membership)
    .innerJoin(user, eq(user.id, membership.userId))
    .where(
      and(
        eq(membership.organisationId, organisationId),
        eq(membership.role, 'instructor'),
        isNull(membership.revokedAt),
      ),
    )
    .orderBy(asc(user.name), asc(user.id))
    .all();
}
