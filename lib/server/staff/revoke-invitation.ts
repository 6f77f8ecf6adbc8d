import 'server-only';
import { eq } from 'drizzle-orm';
import { invitation } from '@/db/schema/organisation';
import { ROLE_WORDS } from '@/lib/domain/access/roles';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { InvitationInput } from '@/lib/schemas/staff';
import { writeAudit } from '../audit/write-audit';
import { inTransaction } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { ownOrganisation } from '../organisations/own-organisation';
import { openInvitation } from './open-invitation';

/** Takes an invitation back: its link opens nothing from now on. */
export function revokeInvitation(
  input: InvitationInput,
  { actor, now }: Pick<Context, 'actor' | 'now'>,
): Result<null, Refusal> {
  return inTransaction((tx) => {
    const own = ownOrganisation(actor, input.organisationId, 'staff.manage', tx);
    const found = own && openInvitation(tx, input);
    if (!found) return refuse('not_found');
    tx.update(invitation).set({ revokedAt: now }).where(eq(invitation.id, found.id)).run();
    writeAudit(tx, {
      organisationId: input.organisationId,
      actorUserId: actor.user?.id ?? null,
      action: 'staff.uninvite',
      subjectId: found.id,
      sentence: `Took back the invitation of ${found.email} as ${ROLE_WORDS[found.role].toLowerCase()}.`,
      now,
    });
    return ok(null);
  });
}
