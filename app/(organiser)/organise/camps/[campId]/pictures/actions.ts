'use server';

import { addPictureSchema, editPictureSchema, pictureRowSchema } from '@/lib/schemas/picture';
import { action } from '@/lib/server/action';
import { addPicture } from '@/lib/server/pictures/add-picture';
import { deletePicture } from '@/lib/server/pictures/delete-picture';
import { editPicture } from '@/lib/server/pictures/edit-picture';
import { goToCamp } from '../../../../_components/go-to';

export const addPictureAction = action({
  schema: addPictureSchema,
  permission: 'camp.edit',
  on: { kind: 'camp', field: 'campId' },
  rate: 'upload',
  hide: ['file'],
  run: addPicture,
  onOk: (_, { campId }) => goToCamp(campId, '/pictures', 'added'),
});

export const editPictureAction = action({
  schema: editPictureSchema,
  permission: 'camp.edit',
  on: { kind: 'camp', field: 'campId' },
  run: editPicture,
  onOk: (_, { campId }) => goToCamp(campId, '/pictures', 'saved'),
});

export const deletePictureAction = action({
  schema: pictureRowSchema,
  permission: 'camp.edit',
  on: { kind: 'camp', field: 'campId' },
  run: deletePicture,
  onOk: (_, { campId }) => goToCamp(campId, '/pictures', 'deleted'),
});
