'use server';

import { workshopRowSchema, workshopSchema } from '@/lib/schemas/workshop';
import { action } from '@/lib/server/action';
import { deleteWorkshop } from '@/lib/server/workshops/delete-workshop';
import { saveWorkshop } from '@/lib/server/workshops/save-workshop';
import { goToCamp } from '../../../../_components/go-to';

export const saveWorkshopAction = action({
  schema: workshopSchema,
  permission: 'camp.edit',
  on: { kind: 'camp', field: 'campId' },
  run: saveWorkshop,
  onOk: ({ keptLength }, { campId, workshopId }) =>
    goToCamp(campId, '/workshops', keptLength > 0 ? 'kept-length' : workshopId ? 'saved' : 'added'),
});

export const deleteWorkshopAction = action({
  schema: workshopRowSchema,
  permission: 'camp.edit',
  on: { kind: 'camp', field: 'campId' },
  run: deleteWorkshop,
  onOk: (_, { campId }) => goToCamp(campId, '/workshops', 'deleted'),
});
