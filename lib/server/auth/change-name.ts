import 'server-only';
import { eq } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { ChangeNameInput } from '@/lib/schemas/account';
import { getDb } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';

export function changeName({ name }: ChangeNameInput, { actor }: Context): Result<null, Refusal> {
  if (!actor.user) return refuse('sign_in_first');
  getDb().update(user).set({ name }).where(eq(user.id, actor.user.id)).run();
  return ok(null);
}
