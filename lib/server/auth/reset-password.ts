import 'server-only';
import { eq } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { homeFor } from '@/lib/domain/account/home-for';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { ResetInput } from '@/lib/schemas/account';
import { getDb, inTransaction } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { log } from '../log';
import { getEmailToken, spendEmailToken } from './email-tokens';
import { hashPassword } from './hash-password';
import { rememberDevice } from './known-device';
import { listRoles } from './list-roles';
import { passwordRefusal } from './password-refusal';
import { setPassword } from './set-password';
import { startSession } from './start-session';

const gone = () =>
  refuse('not_found', {
    sentence: 'This link was used already or is older than an hour. Ask for another one.',
  });

/** Sets a new password by a mailed link, which also proves the address, and signs in. */
export async function resetPassword(
  { token, password }: ResetInput,
  { now, requestId }: Context,
): Promise<Result<{ home: ReturnType<typeof homeFor> }, Refusal>> {
  const link = getEmailToken(token, now);
  const person = link?.kind === 'reset' && getDb().select().from(user).where(eq(user.id, link.userId)).get();
  if (!link || !person || person.disabledAt !== null || person.email !== link.email) return gone();
  const weak = passwordRefusal(password, person);
  if (weak) return weak;
  const passwordHash = await hashPassword(password);
  const done = inTransaction((tx) => {
    if (!spendEmailToken(tx, token, now)) return false;
    setPassword(tx, person, passwordHash, now);
    tx.update(user)
      .set({ emailVerifiedAt: person.emailVerifiedAt ?? now })
      .where(eq(user.id, person.id))
      .run();
    return true;
  });
  if (!done) return gone();
  log.info({ requestId, userId: person.id }, 'password reset');
  if (await startSession(person.id, passwordHash, now)) await rememberDevice(person.email);
  return ok({ home: homeFor(listRoles(person.id)) });
}
