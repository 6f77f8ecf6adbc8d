import 'server-only';
import { and, eq } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { ChangePasswordInput } from '@/lib/schemas/account';
import { inTransaction } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { confirmPerson } from './confirm-person';
import { hashPassword } from './hash-password';
import { passwordRefusal } from './password-refusal';
import { setPassword } from './set-password';
import { startSession } from './start-session';

/** Changes one's password with the present one; every other sign-in ends, this browser gets a new session. */
export async function changePassword(
  { current, password }: ChangePasswordInput,
  context: Context,
): Promise<Result<null, Refusal>> {
  const me = context.actor.user;
  if (!me) return refuse('sign_in_first');
  const person = await confirmPerson(me.id, current, 'current', context);
  if (!person.ok) return person;
  const weak = passwordRefusal(password, me);
  if (weak) return weak;
  const passwordHash = await hashPassword(password);
  const done = inTransaction((tx) => {
    const same = and(eq(user.id, me.id), eq(user.passwordHash, person.value.hash));
    if (!tx.select({ id: user.id }).from(user).where(same).get()) return false;
    setPassword(tx, person.value, passwordHash, context.now);
    return true;
  });
  if (!done) return refuse('stale');
  await startSession(me.id, passwordHash, context.now);
  return ok(null);
}
