import 'server-only';
import { eq } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import type { UserId } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import { getDb } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { spendSignIn } from './sign-in-budget';
import { verifyPassword } from './verify-password';

export type ConfirmedPerson = { id: UserId; email: string; name: string; hash: string };

/** The person of an account, once they gave its password; the same budgets as signing in. `field` is where it was typed. */
export async function confirmPerson(
  userId: UserId,
  password: string,
  field: string,
  context: Context,
): Promise<Result<ConfirmedPerson, Refusal>> {
  const row = getDb()
    .select({
      id: user.id,
      email: user.email,
      name: user.name,
      hash: user.passwordHash,
      disabledAt: user.disabledAt,
    })
    .from(user)
    .where(eq(user.id, userId))
    .get();
  if (!row || row.disabledAt !== null) return refuse('not_found');
  const budget = await spendSignIn(row.email, context.address);
  if (!budget.ok) return refuse('too_many');
  if (!(await verifyPassword(row.hash, password)))
    return refuse('bad_input', {
      fields: { [field]: ['Password is not the one of this account. Type it again.'] },
    });
  await budget.giveBack();
  const { disabledAt: _, ...person } = row;
  return ok(person);
}
