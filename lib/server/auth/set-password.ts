import 'server-only';
import { eq } from 'drizzle-orm';
import { session, user } from '@/db/schema/account';
import type { UserId } from '@/lib/domain/shared/ids';
import type { Tx } from '../db';
import { voidEmailTokens } from './email-tokens';

/** A new password ends every session and voids every open link (ASVS 7.4.3). */
export function setPassword(tx: Tx, person: { id: UserId }, passwordHash: string, now: number): void {
  tx.update(user).set({ passwordHash }).where(eq(user.id, person.id)).run();
  tx.delete(session).where(eq(session.userId, person.id)).run();
  voidEmailTokens(tx, person.id, now);
}
