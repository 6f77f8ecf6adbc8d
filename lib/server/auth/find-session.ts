import 'server-only';
import type { Session, User } from 'lucia';
import { hashToken } from '../hash-token';
import { lucia } from './lucia';

/**
 * The session and person behind a cookie's token, or null. The table's key is the token's SHA-256, so a copy of the
 * database signs nobody in. lucia checks and slides the idle limit; the absolute limit and disabled people are ours.
 */
export async function findSession(
  token: string,
  now: number,
): Promise<{ session: Session; user: User } | null> {
  const { session, user } = await lucia().validateSession(hashToken(token));
  if (!session) return null;
  if (session.endsAt <= now || user.disabledAt !== null) {
    await lucia().invalidateSession(session.id);
    return null;
  }
  return { session, user };
}
