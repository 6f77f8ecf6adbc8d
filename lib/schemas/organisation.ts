import { z } from 'zod';
import { emailSchema } from './account';
import { lineText } from './line-text';
import { rowId } from './row-id';

const fields = {
  name: lineText('Name', 100, 'Give the name that players know.'),
  email: emailSchema,
};

export const createOrganisationSchema = z.object(fields);
export type CreateOrganisationInput = z.output<typeof createOrganisationSchema>;

export const editOrganisationSchema = z.object({ organisationId: rowId('org'), ...fields });
export type EditOrganisationInput = z.output<typeof editOrganisationSchema>;
