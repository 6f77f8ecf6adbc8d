import 'server-only';
import { eq } from 'drizzle-orm';
import { cookies } from 'next/headers';
import { user } from '@/db/schema/account';
import type { UserId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';
import { hashToken, newToken } from '../hash-token';
import { lucia } from './lucia';
import { requestDevice } from './request-device';
import { sessionCookieName, setSessionCookie } from './session-cookie';
import { ABSOLUTE_MS } from './session-limits';

/**
 * Signs a person in on this browser. Always a new token, and whatever session the browser held before ends, so that a
 * token planted beforehand is worth nothing (ASVS 7.2.4). `passwordHash` is what was verified: when a reset changed it
 * in the meantime the new session is taken back and the answer is false.
 */
export async function startSession(userId: UserId, passwordHash: string, now: number): Promise<boolean> {
  const before = (await cookies()).get(sessionCookieName())?.value;
  if (before) await lucia().invalidateSession(hashToken(before));
  const token = newToken();
  const made = await lucia().createSession(
    userId,
    { endsAt: now + ABSOLUTE_MS, createdAt: now, device: await requestDevice() },
    { sessionId: hashToken(token) },
  );
  const still = getDb().select({ hash: user.passwordHash }).from(user).where(eq(user.id, userId)).get();
  if (still?.hash !== passwordHash) {
    await lucia().invalidateSession(made.id);
    return false;
  }
  await setSessionCookie(token);
  return true;
}
