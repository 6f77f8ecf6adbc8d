import { z } from 'zod';
import { STAFF_ROLES } from '@/lib/domain/access/roles';
import { isId } from '@/lib/domain/shared/ids';
import { emailSchema } from './account';

const organisationId = z.custom<`org_${string}`>(
  (given) => typeof given === 'string' && isId('org', given),
  'Organisation is missing. Open the page again.',
);

export const inviteStaffSchema = z.object({
  organisationId,
  email: emailSchema,
  role: z.enum(STAFF_ROLES, { error: 'Role is not chosen. Choose what this person does for you.' }),
});
export type InviteStaffInput = z.infer<typeof inviteStaffSchema>;

export const invitationSchema = z.object({
  organisationId,
  invitationId: z.custom<`inv_${string}`>(
    (given) => typeof given === 'string' && isId('inv', given),
    'Invitation is missing. Open the page again.',
  ),
});
export type InvitationInput = z.infer<typeof invitationSchema>;

export const revokeRoleSchema = z.object({
  organisationId,
  membershipId: z.custom<`mbr_${string}`>(
    (given) => typeof given === 'string' && isId('mbr', given),
    'Role is missing. Open the page again.',
  ),
});
export type RevokeRoleInput = z.infer<typeof revokeRoleSchema>;

export const acceptInvitationSchema = z.object({
  token: z.string({ error: 'Link is incomplete. Open it from the letter again.' }).min(1).max(100),
});
export type AcceptInvitationInput = z.infer<typeof acceptInvitationSchema>;
