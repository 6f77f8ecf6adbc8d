'use server';

import type { Route } from 'next';
import { redirect } from 'next/navigation';
import { editOrganisationSchema } from '@/lib/schemas/organisation';
import { action } from '@/lib/server/action';
import { editOrganisation } from '@/lib/server/organisations/edit-organisation';

export const editOrganisationAction = action({
  schema: editOrganisationSchema,
  permission: 'organisation.edit',
  on: { kind: 'organisation', field: 'organisationId' },
  run: editOrganisation,
  onOk: ({ organisationId }) => redirect(`/organise/organisations/${organisationId}?done=saved` as Route),
});
