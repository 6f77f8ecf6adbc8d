import 'server-only';
import { and, eq, isNull } from 'drizzle-orm';
import { invitation, membership } from '@/db/schema/organisation';
import { ROLE_WORDS, type StaffRole } from '@/lib/domain/access/roles';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { AcceptInvitationInput } from '@/lib/schemas/staff';
import { writeAudit } from '../audit/write-audit';
import { inTransaction } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { newId } from '../new-id';
import { getInvitation } from './get-invitation';

/**
 * Takes the role that was offered, for the very address it was offered to, once: of two that race, the transaction
 * lets one see the invitation open (ASVS 6.4.1).
 */
export function acceptInvitation(
  { token }: AcceptInvitationInput,
  { actor, now }: Pick<Context, 'actor' | 'now'>,
): Result<{ role: StaffRole }, Refusal> {
  const me = actor.user;
  if (!me) return refuse('sign_in_first');
  return inTransaction((tx) => {
    const offer = getInvitation(token, now, tx);
    if (!offer)
      return refuse('not_found', {
        sentence: 'This invitation was used, taken back or is too old. Ask for another one.',
      });
    if (offer.email !== me.email || !me.emailVerified)
      return refuse('not_allowed', {
        sentence: `This invitation is for ${offer.email}. Sign in with an account whose confirmed address that is.`,
      });
    tx.update(invitation).set({ acceptedAt: now }).where(eq(invitation.id, offer.id)).run();
    const held = tx
      .select({ id: membership.id })
      .from(membership)
      .where(
        and(
          eq(membership.organisationId, offer.organisationId),
          eq(membership.userId, me.id),
          eq(membership.role, offer.role),
          isNull(membership.revokedAt),
        ),
      )
      .get();
    if (held) return ok({ role: offer.role });
    const id = newId('mbr', now);
    tx.insert(membership)
      .values({ id, organisationId: offer.organisationId, userId: me.id, role: offer.role, createdAt: now })
      .run();
    writeAudit(tx, {
      organisationId: offer.organisationId,
      actorUserId: me.id,
      action: 'staff.accept',
      subjectId: id,
      sentence: `${me.name} is now ${ROLE_WORDS[offer.role].toLowerCase()}.`,
      now,
    });
    return ok({ role: offer.role });
  });
}
