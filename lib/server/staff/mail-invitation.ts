import 'server-only';
import { eq } from 'drizzle-orm';
import { invitation } from '@/db/schema/organisation';
import type { StaffRole } from '@/lib/domain/access/roles';
import { INVITE_DAYS } from '@/lib/domain/account/link-limits';
import type { Id } from '@/lib/domain/shared/ids';
import type { Tx } from '../db';
import { hashToken, newToken } from '../hash-token';
import { enqueueMail } from '../mail/enqueue-mail';

const DAY = 24 * 60 * 60 * 1000;

export const invitationEnd = (now: number): number => now + INVITE_DAYS * DAY;

/** Gives an invitation a new link and mails it; the one before opens nothing any more. */
export function mailInvitation(
  tx: Tx,
  letter: {
    id: Id<'inv'>;
    email: string;
    role: StaffRole;
    organisationName: string;
    invitedBy: string;
    now: number;
  },
): void {
  const { id, email, now, ...words } = letter;
  const token = newToken();
  tx.update(invitation)
    .set({ tokenHash: hashToken(token), expiresAt: invitationEnd(now) })
    .where(eq(invitation.id, id))
    .run();
  enqueueMail(tx, { kind: 'invite', toName: '', toEmail: email, payload: { token, ...words }, now });
}
