'use server';

import type { Route } from 'next';
import { redirect } from 'next/navigation';
import { verifySchema } from '@/lib/schemas/account';
import { action } from '@/lib/server/action';
import { verifyAddress } from '@/lib/server/auth/verify-address';

export const verifyAction = action({
  schema: verifySchema,
  permission: 'account.open',
  hide: ['password'],
  run: verifyAddress,
  onOk: ({ to }) => redirect(to as Route),
});
