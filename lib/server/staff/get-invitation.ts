import 'server-only';
import { and, eq, gt, isNull } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { invitation, organisation } from '@/db/schema/organisation';
import { type Db, getDb, type Tx } from '../db';
import { hashToken } from '../hash-token';

/** What a mailed invitation is for, while it can be accepted; null otherwise. Changes nothing. */
export const getInvitation = (token: string, now: number, db: Db | Tx = getDb()) =>
  db
    .select({
      id: invitation.id,
      email: invitation.email,
      role: invitation.role,
      organisationId: invitation.organisationId,
      organisationName: organisation.name,
      invitedBy: user.name,
    })
    .from(invitation)
    .innerJoin(organisation, eq(organisation.id, invitation.organisationId))
    .innerJoin(user, eq(user.id, invitation.invitedBy))
    .where(
      and(
        eq(invitation.tokenHash, hashToken(token)),
        isNull(invitation.acceptedAt),
        isNull(invitation.revokedAt),
        gt(invitation.expiresAt, now),
      ),
    )
    .get() ?? null;
