'use server';

import type { Route } from 'next';
import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import type { OrganisationId } from '@/lib/domain/shared/ids';
import { invitationSchema, inviteStaffSchema, revokeRoleSchema } from '@/lib/schemas/staff';
import { action } from '@/lib/server/action';
import { inviteStaff } from '@/lib/server/staff/invite-staff';
import { resendInvitation } from '@/lib/server/staff/resend-invitation';
import { revokeInvitation } from '@/lib/server/staff/revoke-invitation';
import { revokeRole } from '@/lib/server/staff/revoke-role';

const on = { kind: 'organisation', field: 'organisationId' } as const;
const showAnew = (_: unknown, { organisationId }: { organisationId: OrganisationId }) =>
  revalidatePath(`/organise/organisations/${organisationId}/staff`);

export const inviteStaffAction = action({
  schema: inviteStaffSchema,
  permission: 'staff.manage',
  on,
  run: inviteStaff,
  onOk: showAnew,
});

export const resendInvitationAction = action({
  schema: invitationSchema,
  permission: 'staff.manage',
  on,
  run: resendInvitation,
  onOk: showAnew,
});

export const revokeInvitationAction = action({
  schema: invitationSchema,
  permission: 'staff.manage',
  on,
  run: revokeInvitation,
  onOk: showAnew,
});

export const revokeRoleAction = action({
  schema: revokeRoleSchema,
  permission: 'staff.manage',
  on,
  run: revokeRole,
  // Who gave up their own role may not see this page any more.
  onOk: ({ own }, input) => (own ? redirect('/organise' as Route) : showAnew(null, input)),
});
