import 'server-only';
import { and, eq, isNull } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { invitation, membership } from '@/db/schema/organisation';
import { ROLE_WORDS } from '@/lib/domain/access/roles';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { InviteStaffInput } from '@/lib/schemas/staff';
import { writeAudit } from '../audit/write-audit';
import { inTransaction, type Tx } from '../db';
import { type Refusal, refuse } from '../errors';
import { newToken } from '../hash-token';
import type { Context } from '../ladder';
import { newId } from '../new-id';
import { ownOrganisation } from '../organisations/own-organisation';
import { spend } from '../rate-limit';
import { invitationEnd, mailInvitation } from './mail-invitation';

/** Invites an address to a role. An older invitation to the same role is taken back, so that one link works at a time. */
export async function inviteStaff(
  input: InviteStaffInput,
  { actor, now }: Pick<Context, 'actor' | 'now'>,
): Promise<Result<null, Refusal>> {
  const { organisationId, email, role } = input;
  if (!actor.user) return refuse('sign_in_first');
  if (!(await spend('mail-link', `invite ${email}`)))
    return refuse('too_many', {
      sentence: 'This address was invited several times within an hour. Wait a while before you write again.',
    });
  const by = actor.user;
  return inTransaction((tx) => {
    const own = ownOrganisation(actor, organisationId, 'staff.manage', tx);
    if (!own) return refuse('not_found');
    if (holdsRole(tx, input))
      return refuse('bad_input', {
        fields: { email: [`E-mail belongs to someone who is ${ROLE_WORDS[role].toLowerCase()} already.`] },
      });
    tx.update(invitation)
      .set({ revokedAt: now })
      .where(
        and(
          eq(invitation.organisationId, organisationId),
          eq(invitation.email, email),
          eq(invitation.role, role),
          isNull(invitation.acceptedAt),
          isNull(invitation.revokedAt),
        ),
      )
      .run();
    const id = newId('inv', now);
    tx.insert(invitation)
      .values({
        id,
        organisationId,
        email,
        role,
        // Replaced by the mailed link's in the next statement.
        tokenHash: newToken(),
        invitedBy: by.id,
        expiresAt: invitationEnd(now),
        createdAt: now,
      })
      .run();
    mailInvitation(tx, { id, email, role, organisationName: own.name, invitedBy: by.name, now });
    writeAudit(tx, {
      organisationId,
      actorUserId: by.id,
      action: 'staff.invite',
      subjectId: id,
      sentence: `Invited ${email} as ${ROLE_WORDS[role].toLowerCase()}.`,
      now,
    });
    return ok(null);
  });
}

const holdsRole = (tx: Tx, { organisationId, email, role }: InviteStaffInput): boolean =>
  tx
    .select({ id: membership.id })
    .from(membership)
    .innerJoin(user, eq(user.id, membership.userId))
    .where(
      and(
        eq(membership.organisationId, organisationId),
        eq(user.email, email),
        eq(membership.role, role),
        isNull(membership.revokedAt),
      ),
    )
    .get() !== undefined;
