import 'server-only';
import { and, eq } from 'drizzle-orm';
import { session } from '@/db/schema/account';
import { ok, type Result } from '@/lib/domain/shared/result';
import { getDb } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';

/** Ends one of one's own sign-ins; the owner is in the query, so another's id ends nothing. */
export function endSession({ sessionId }: { sessionId: string }, { actor }: Context): Result<null, Refusal> {
  if (!actor.user) return refuse('sign_in_first');
  const own = and(eq(session.id, sessionId), eq(session.userId, actor.user.id));
  const { changes } = getDb().delete(session).where(own).run();
  return changes === 1 ? ok(null) : refuse('not_found');
}
