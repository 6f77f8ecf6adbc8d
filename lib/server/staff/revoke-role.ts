import 'server-only';
import { and, count, eq, isNull } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { membership } from '@/db/schema/organisation';
import { ROLE_WORDS } from '@/lib/domain/access/roles';
import type { OrganisationId } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { RevokeRoleInput } from '@/lib/schemas/staff';
import { writeAudit } from '../audit/write-audit';
import { inTransaction, type Tx } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { ownOrganisation } from '../organisations/own-organisation';

/**
 * Takes a role away, at once: roles are read afresh by each request. The last organiser stays, or nobody could ever
 * give a role again; two who take each other's away at the same time are decided by the transaction's lock.
 */
export function revokeRole(
  { organisationId, membershipId }: RevokeRoleInput,
  { actor, now }: Pick<Context, 'actor' | 'now'>,
): Result<{ own: boolean }, Refusal> {
  return inTransaction((tx) => {
    if (!ownOrganisation(actor, organisationId, 'staff.manage', tx)) return refuse('not_found');
    const row = tx
      .select({ userId: membership.userId, role: membership.role, name: user.name })
      .from(membership)
      .innerJoin(user, eq(user.id, membership.userId))
      .where(
        and(
          eq(membership.id, membershipId),
          eq(membership.organisationId, organisationId),
          isNull(membership.revokedAt),
        ),
      )
      .get();
    if (!row) return refuse('not_found');
    if (row.role === 'organiser' && countOrganisers(tx, organisationId) <= 1)
      return refuse('bad_input', {
        sentence: `${row.name} is the last organiser. Give the role to someone else first, then take it away here.`,
      });
    tx.update(membership).set({ revokedAt: now }).where(eq(membership.id, membershipId)).run();
    writeAudit(tx, {
      organisationId,
      actorUserId: actor.user?.id ?? null,
      action: 'staff.revoke',
      subjectId: membershipId,
      sentence: `${row.name} is no longer ${ROLE_WORDS[row.role].toLowerCase()}.`,
      now,
    });
    return ok({ own: row.userId === actor.user?.id });
  });
}

const countOrganisers = (tx: Tx, organisationId: OrganisationId): number =>
  tx
    .select({ n: count() })
    .from(membership)
    .innerJoin(user, eq(user.id, membership.userId))
    .where(
      and(
        eq(membership.organisationId, organisationId),
        eq(membership.role, 'organiser'),
        isNull(membership.revokedAt),
        // Someone whose account is closed cannot give roles either.
        isNull(user.disabledAt),
      ),
    )
    .get()?.n ?? 0;
