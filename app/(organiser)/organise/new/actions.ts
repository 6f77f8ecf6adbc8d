'use server';

import type { Route } from 'next';
import { redirect } from 'next/navigation';
import { createOrganisationSchema } from '@/lib/schemas/organisation';
import { action } from '@/lib/server/action';
import { createOrganisation } from '@/lib/server/organisations/create-organisation';

export const createOrganisationAction = action({
  schema: createOrganisationSchema,
  permission: 'organisation.create',
  run: createOrganisation,
  onOk: ({ organisationId }) => redirect(`/organise/organisations/${organisationId}` as Route),
});
