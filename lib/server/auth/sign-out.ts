import 'server-only';
import { eq } from 'drizzle-orm';
import { cookies } from 'next/headers';
import { session } from '@/db/schema/account';
import type { UserId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';
import { hashToken } from '../hash-token';
import { lucia } from './lucia';
import { ordersCookieName } from './order-grants';
import { clearSessionCookie, cookieFlags, sessionCookieName } from './session-cookie';

/** Ends this browser's session, or all of the person's, and forgets the orders that this browser could open by link. */
export async function signOut(userId: UserId, reach: 'here' | 'everywhere'): Promise<void> {
  const jar = await cookies();
  const token = jar.get(sessionCookieName())?.value;
  if (reach === 'everywhere') getDb().delete(session).where(eq(session.userId, userId)).run();
  else if (token) await lucia().invalidateSession(hashToken(token));
  await clearSessionCookie();
  // By hand: a browser drops no `__Host-` cookie at the word of a header that is not Secure itself.
  jar.set(ordersCookieName(), '', { ...cookieFlags(), maxAge: 0 });
}
