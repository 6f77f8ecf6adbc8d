'use server';

import { blockRowSchema, blockSchema } from '@/lib/schemas/block';
import { action } from '@/lib/server/action';
import { deleteBlock } from '@/lib/server/blocks/delete-block';
import { saveBlock } from '@/lib/server/blocks/save-block';
import { goToCamp } from '../../../../_components/go-to';

export const saveBlockAction = action({
  schema: blockSchema,
  permission: 'camp.edit',
  on: { kind: 'camp', field: 'campId' },
  run: saveBlock,
  onOk: (_, { campId, blockId }) => goToCamp(campId, '/times', blockId ? 'saved' : 'added'),
});

export const deleteBlockAction = action({
  schema: blockRowSchema,
  permission: 'camp.edit',
  on: { kind: 'camp', field: 'campId' },
  run: deleteBlock,
  onOk: (_, { campId }) => goToCamp(campId, '/times', 'deleted'),
});
