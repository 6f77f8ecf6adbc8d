import type { Route } from 'next';
import Link from 'next/link';
import { ActionForm } from '@/components/forms/action-form';
import { SelectField } from '@/components/forms/select-field';
import { TextField } from '@/components/forms/text-field';
import { saveInstructorAction } from '../actions';

type InstructorFormProps = {
  campId: string;
  organisationId: string;
  instructorId?: string;
  defaultValue?: Record<string, unknown>;
  accounts: readonly { id: string; name: string; email: string }[];
};

export function InstructorForm({
  campId,
  organisationId,
  instructorId,
  defaultValue,
  accounts,
}: InstructorFormProps) {
  return (
    <ActionForm
      action={saveInstructorAction}
      submit={instructorId ? 'Save' : 'Add the instructor'}
      hidden={{ campId, ...(instructorId && { instructorId }) }}
      defaultValue={defaultValue}
    >
      <TextField name="name" label="Name" hint="As players read it." autoComplete="off" />
      <TextField
        name="bio"
        label="About"
        rows={5}
        optional
        hint="Two or three sentences for the public page."
      />
      <SelectField
        name="userId"
        label="Account"
        optional
        blank="None"
        hint={
          <>
            Lets them see their own meetings and rosters. Invite instructors under{' '}
            <Link href={`/organise/organisations/${organisationId}/staff` as Route}>Staff</Link>; whoever
            accepts is in this list.
          </>
        }
        choices={accounts.map(({ id, name, email }) => ({ value: id, label: `${name} (${email})` }))}
      />
    </ActionForm>
  );
}
