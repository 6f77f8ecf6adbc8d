'use server';

import { copyCampSchema } from '@/lib/schemas/camp';
import { action } from '@/lib/server/action';
import { copyCamp } from '@/lib/server/camps/copy-camp';
import { goToCamp } from '../../../../_components/go-to';

export const copyCampAction = action({
  schema: copyCampSchema,
  permission: 'camp.edit',
  on: { kind: 'camp', field: 'campId' },
  run: copyCamp,
  onOk: ({ campId }) => goToCamp(campId, '', 'copied'),
});
