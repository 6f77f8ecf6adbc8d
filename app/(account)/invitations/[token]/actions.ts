'use server';

import type { Route } from 'next';
import { redirect } from 'next/navigation';
import { homeFor } from '@/lib/domain/account/home-for';
import { acceptInvitationSchema } from '@/lib/schemas/staff';
import { action } from '@/lib/server/action';
import { acceptInvitation } from '@/lib/server/staff/accept-invitation';

export const acceptInvitationAction = action({
  schema: acceptInvitationSchema,
  permission: 'invitation.accept',
  run: acceptInvitation,
  onOk: ({ role }) => redirect(homeFor([{ role }]) as Route),
});
