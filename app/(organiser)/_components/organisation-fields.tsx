import { TextField } from '@/components/forms/text-field';

export function OrganisationFields() {
  return (
    <>
      <TextField name="name" label="Name" hint="As players know you." autoComplete="organization" />
      <TextField
        name="email"
        label="E-mail for players"
        type="email"
        hint="Printed on camp pages and in mails as the address to write to."
        autoComplete="email"
      />
    </>
  );
}
