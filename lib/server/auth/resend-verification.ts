import 'server-only';
import { and, eq, isNull } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { ok, type Result } from '@/lib/domain/shared/result';
import { inTransaction } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { later } from '../later';
import { spend } from '../rate-limit';
import { mailAccountLink } from './mail-account-link';
import { getOpening } from './opening-cookie';

/** Another proof link, for who is signed in or just opened an account here. Says the same where there is none to send. */
export async function resendVerification(context: Context): Promise<Result<null, Refusal>> {
  const opening = await getOpening();
  const { actor, now, requestId } = context;
  const email = actor.user?.email ?? opening?.email;
  if (!email) return refuse('sign_in_first');
  if (!(await spend('sign-up', context.address))) return refuse('too_many');
  later(requestId, async () => {
    if (!(await spend('mail-link', `verify ${email}`))) return;
    inTransaction((tx) => {
      const row = tx
        .select({ id: user.id, name: user.name })
        .from(user)
        .where(and(eq(user.email, email), isNull(user.emailVerifiedAt), isNull(user.disabledAt)))
        .get();
      if (row && (row.id === actor.user?.id || opening?.opened(row.id)))
        mailAccountLink(tx, { userId: row.id, name: row.name, email, kind: 'verify', now });
    });
  });
  return ok(null);
}
