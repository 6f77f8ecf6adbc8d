import 'server-only';
import { eq } from 'drizzle-orm';
import { session, user } from '@/db/schema/account';
import type { UserId } from '@/lib/domain/shared/ids';
import type { Tx } from '../db';
import { enqueueMail } from '../mail/enqueue-mail';
import { voidEmailTokens } from './email-tokens';

/** A new password ends every session and voids every open link (ASVS 7.4.3), and its owner is told by mail. */
export function setPassword(
  tx: Tx,
  person: { id: UserId; email: string; name: string },
  passwordHash: string,
  now: number,
): void {
  tx.update(user).set({ passwordHash }).where(eq(user.id, person.id)).run();
  tx.delete(session).where(eq(session.userId, person.id)).run();
  voidEmailTokens(tx, person.id, now);
  enqueueMail(tx, {
    kind: 'account-changed',
    toName: person.name,
    toEmail: person.email,
    payload: { change: 'password' },
    now,
  });
}
