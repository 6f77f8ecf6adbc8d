import { ActionForm } from '@/components/forms/action-form';
import { ChoiceField } from '@/components/forms/choice-field';
import { TextField } from '@/components/forms/text-field';
import { ROLE_WORDS, STAFF_ROLES, type StaffRole } from '@/lib/domain/access/roles';
import type { OrganisationId } from '@/lib/domain/shared/ids';
import { inviteStaffAction } from '../actions';

const MAY = {
  organiser: 'Everything here: camps, people, money, and who has which role.',
  treasurer: 'Sees people and money of every camp, and exports both.',
  instructor: 'Sees the programme and the people of their own meetings.',
  door: 'Scans tickets and marks arrivals. Sees no health details.',
} satisfies Record<StaffRole, string>;

export function InviteForm({ organisationId }: { organisationId: OrganisationId }) {
  return (
    <ActionForm
      action={inviteStaffAction}
      submit="Send the invitation"
      hidden={{ organisationId }}
      done="The invitation is on its way. Its link works for a week."
    >
      <TextField
        name="email"
        label="E-mail"
        type="email"
        autoComplete="off"
        spellCheck={false}
        hint="They accept with an account of this address, or open one first."
      />
      <ChoiceField
        name="role"
        legend="Role"
        type="radio"
        choices={STAFF_ROLES.map((role) => ({ value: role, label: ROLE_WORDS[role], hint: MAY[role] }))}
      />
    </ActionForm>
  );
}
