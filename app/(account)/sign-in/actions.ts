'use server';

import type { Route } from 'next';
import { redirect } from 'next/navigation';
import { safeNext } from '@/lib/domain/account/safe-next';
import { signInSchema } from '@/lib/schemas/account';
import { action } from '@/lib/server/action';
import { signIn } from '@/lib/server/auth/sign-in';

export const signInAction = action({
  schema: signInSchema,
  permission: 'account.open',
  hide: ['password'],
  run: signIn,
  onOk: ({ home }, { next }) => redirect((safeNext(next) ?? home) as Route),
});
