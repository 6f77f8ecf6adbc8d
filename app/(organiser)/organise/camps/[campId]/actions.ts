'use server';

import { refresh } from 'next/cache';
import { campStateSchema } from '@/lib/schemas/camp';
import { moveRowSchema } from '@/lib/schemas/move';
import { action } from '@/lib/server/action';
import { closeCamp } from '@/lib/server/camps/close-camp';
import { moveRow } from '@/lib/server/camps/move-row';
import { publishCamp } from '@/lib/server/camps/publish-camp';
import { goToCamp } from '../../../_components/go-to';

export const publishCampAction = action({
  schema: campStateSchema,
  permission: 'camp.publish',
  on: { kind: 'camp', field: 'campId' },
  run: ({ campId }, context) => publishCamp(campId, context),
  onOk: ({ campId }) => goToCamp(campId, '', 'published'),
});

export const closeCampAction = action({
  schema: campStateSchema,
  permission: 'camp.publish',
  on: { kind: 'camp', field: 'campId' },
  run: ({ campId }, context) => closeCamp(campId, context),
  onOk: ({ campId }) => goToCamp(campId, '', 'closed'),
});

export const moveRowAction = action({
  schema: moveRowSchema,
  permission: 'camp.edit',
  on: { kind: 'camp', field: 'campId' },
  run: moveRow,
  onOk: () => refresh(),
});
