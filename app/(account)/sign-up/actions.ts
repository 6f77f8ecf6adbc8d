'use server';

import type { Route } from 'next';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { signUpSchema } from '@/lib/schemas/account';
import { action } from '@/lib/server/action';
import { openAccount } from '@/lib/server/auth/open-account';
import { resendVerification } from '@/lib/server/auth/resend-verification';

export const signUpAction = action({
  schema: signUpSchema,
  permission: 'account.open',
  hide: ['password'],
  run: openAccount,
  onOk: () => redirect('/sign-up/sent' as Route),
});

export const resendVerificationAction = action({
  schema: z.object({}),
  permission: 'account.open',
  run: (_input, context) => resendVerification(context),
});
