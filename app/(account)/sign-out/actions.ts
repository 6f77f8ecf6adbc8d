'use server';

import type { Route } from 'next';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { ok } from '@/lib/domain/shared/result';
import { action } from '@/lib/server/action';
import { signOut } from '@/lib/server/auth/sign-out';
import { clearDraftToken } from '@/lib/server/registration/draft-cookie';

export const signOutAction = action({
  schema: z.object({}),
  permission: 'account.own',
  run: async (_input, { actor }) => {
    if (actor.user) await signOut(actor.user.id, 'here');
    await clearDraftToken();
    return ok(null);
  },
  onOk: () => redirect('/signed-out' as Route),
});

export const signOutEverywhereAction = action({
  schema: z.object({}),
  permission: 'account.own',
  run: async (_input, { actor }) => {
    if (actor.user) await signOut(actor.user.id, 'everywhere');
    await clearDraftToken();
    return ok(null);
  },
  onOk: () => redirect('/signed-out' as Route),
});
