'use server';

import { createCampSchema } from '@/lib/schemas/camp';
import { action } from '@/lib/server/action';
import { createCamp } from '@/lib/server/camps/create-camp';
import { goToCamp } from '../../../../../_components/go-to';

export const createCampAction = action({
  schema: createCampSchema,
  permission: 'camp.create',
  on: { kind: 'organisation', field: 'organisationId' },
  run: createCamp,
  onOk: ({ campId }) => goToCamp(campId, '', 'made'),
});
