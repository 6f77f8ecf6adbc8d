import 'server-only';
import { and, desc, eq, isNull } from 'drizzle-orm';
import { invitation } from '@/db/schema/organisation';
import type { Actor } from '@/lib/domain/access/actor';
import type { StaffRole } from '@/lib/domain/access/roles';
import type { Id, OrganisationId } from '@/lib/domain/shared/ids';
import { ownedBy } from '../access/owned-by';
import { getDb } from '../db';

export type InvitationRow = {
  id: Id<'inv'>;
  email: string;
  role: StaffRole;
  createdAt: number;
  expiresAt: number;
};

/** Invitations without an answer yet, those that ran out included, newest first. */
export const listInvitations = (actor: Actor, organisationId: OrganisationId): InvitationRow[] =>
  getDb()
    .select({
      id: invitation.id,
      email: invitation.email,
      role: invitation.role,
      createdAt: invitation.createdAt,
      expiresAt: invitation.expiresAt,
    })
    .from(invitation)
    .where(
      and(
        eq(invitation.organisationId, organisationId),
        isNull(invitation.acceptedAt),
        isNull(invitation.revokedAt),
        ownedBy(actor, 'staff.manage', invitation.organisationId),
      ),
    )
    .orderBy(desc(invitation.createdAt), desc(invitation.id))
    .all();
