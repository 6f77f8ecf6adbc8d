'use server';

import { editCampSchema } from '@/lib/schemas/camp';
import { action } from '@/lib/server/action';
import { editCamp } from '@/lib/server/camps/edit-camp';
import { goToCamp } from '../../../../_components/go-to';

export const editCampAction = action({
  schema: editCampSchema,
  permission: 'camp.edit',
  on: { kind: 'camp', field: 'campId' },
  run: editCamp,
  onOk: ({ campId }) => goToCamp(campId, '', 'saved'),
});
