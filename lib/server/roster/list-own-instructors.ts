import 'server-only';
import { and, asc, eq } from 'drizzle-orm';
import { camp, instructor } from '@/db/schema/camp';
import type { Actor } from '@/lib/domain/access/actor';
import { can } from '@/lib/domain/access/can';
import type { CampId, OrganisationId } from '@/lib/domain/shared/ids';
import { ownedBy } from '../access/owned-by';
import { getDb } from '../db';

/**
 * The instructors of a camp whose meetings the actor may see: everyone for an organiser, otherwise those linked to the
 * actor's own account. `own` says which are the actor's.
 */
export function listOwnInstructors(actor: Actor, of: { id: CampId; organisationId: OrganisationId }) {
  const userId = actor.user?.id;
  if (!userId) return [];
  const all = can(actor, 'camp.edit', { organisationId: of.organisationId });
  return getDb()
    .select({ id: instructor.id, name: instructor.name, userId: instructor.userId })
    .from(instructor)
    .innerJoin(camp, eq(camp.id, instructor.campId))
    .where(
      and(
        eq(instructor.campId, of.id),
        ownedBy(actor, 'roster.own', camp.organisationId),
        all ? undefined : eq(instructor.userId, userId),
      ),
    )
    .orderBy(asc(instructor.position), asc(instructor.id))
    .all()
    .map(({ userId: linked, ...row }) => ({ ...row, own: linked === userId }));
}
