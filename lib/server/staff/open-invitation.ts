import 'server-only';
import { and, eq, isNull } from 'drizzle-orm';
import { invitation } from '@/db/schema/organisation';
import type { InvitationInput } from '@/lib/schemas/staff';
import type { Db, Tx } from '../db';

/** An invitation of this organisation that has no answer yet, run out or not. */
export const openInvitation = (tx: Db | Tx, { organisationId, invitationId }: InvitationInput) =>
  tx
    .select({ id: invitation.id, email: invitation.email, role: invitation.role })
    .from(invitation)
    .where(
      and(
        eq(invitation.id, invitationId),
        eq(invitation.organisationId, organisationId),
        isNull(invitation.acceptedAt),
        isNull(invitation.revokedAt),
      ),
    )
    .get();
