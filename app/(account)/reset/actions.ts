'use server';

import type { Route } from 'next';
import { redirect } from 'next/navigation';
import { askResetSchema, resetSchema } from '@/lib/schemas/account';
import { action } from '@/lib/server/action';
import { askReset } from '@/lib/server/auth/ask-reset';
import { resetPassword } from '@/lib/server/auth/reset-password';

export const askResetAction = action({
  schema: askResetSchema,
  permission: 'account.open',
  run: askReset,
});

export const resetAction = action({
  schema: resetSchema,
  permission: 'account.open',
  hide: ['password'],
  run: resetPassword,
  onOk: ({ home }) => redirect(home as Route),
});
