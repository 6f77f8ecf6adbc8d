import 'server-only';
import { and, eq, isNull } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { AskResetInput } from '@/lib/schemas/account';
import { inTransaction } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { later } from '../later';
import { spend } from '../rate-limit';
import { mailAccountLink } from './mail-account-link';

/**
 * Mails a link to set a new password, where the address is known; the answer does not tell. Who asks again and again
 * for somebody else's sends them five working links an hour at most, and so keeps nobody from getting one.
 */
export async function askReset(
  { email }: AskResetInput,
  { now, address, requestId }: Context,
): Promise<Result<null, Refusal>> {
  if (!(await spend('sign-up', address))) return refuse('too_many');
  later(requestId, async () => {
    if (!(await spend('mail-link', `reset ${email}`))) return;
    inTransaction((tx) => {
      const row = tx
        .select({ userId: user.id, name: user.name })
        .from(user)
        .where(and(eq(user.email, email), isNull(user.disabledAt)))
        .get();
      if (row) mailAccountLink(tx, { ...row, email, kind: 'reset', now });
    });
  });
  return ok(null);
}
