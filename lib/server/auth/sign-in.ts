import 'server-only';
import { eq } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { homeFor } from '@/lib/domain/account/home-for';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { SignInInput } from '@/lib/schemas/account';
import { getDb } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { log } from '../log';
import { rememberDevice } from './known-device';
import { listRoles } from './list-roles';
import { spendSignIn } from './sign-in-budget';
import { startSession } from './start-session';
import { verifyPassword } from './verify-password';

/** One sentence for an unknown address, a wrong password and a closed account (ASVS 6.3.8). */
const NO_MATCH =
  'That e-mail and password do not belong together. Check both, or set a new password by mail.';
const TOO_MANY =
  'That was a lot of tries. Wait 15 minutes, or set a new password by mail: that works at once.';

/** Signs in and answers where to go. */
export async function signIn(
  { email, password }: SignInInput,
  context: Context,
): Promise<Result<{ home: ReturnType<typeof homeFor> }, Refusal>> {
  const budget = await spendSignIn(email, context.address);
  if (!budget.ok) return refuse('too_many', { sentence: TOO_MANY });
  const row = getDb()
    .select({ id: user.id, hash: user.passwordHash, disabledAt: user.disabledAt })
    .from(user)
    .where(eq(user.email, email))
    .get();
  const right = await verifyPassword(row?.hash ?? null, password);
  const known = row && row.disabledAt === null && right ? row : null;
  if (!known || !(await startSession(known.id, known.hash, context.now))) {
    log.info({ requestId: context.requestId }, 'sign-in refused');
    return refuse('bad_input', { sentence: NO_MATCH });
  }
  await budget.giveBack();
  await rememberDevice(email);
  log.info({ requestId: context.requestId, userId: known.id }, 'signed in');
  return ok({ home: homeFor(listRoles(known.id)) });
}
