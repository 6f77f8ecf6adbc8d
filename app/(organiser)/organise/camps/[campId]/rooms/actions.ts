'use server';

import { roomRowSchema, roomSchema } from '@/lib/schemas/room';
import { action } from '@/lib/server/action';
import { deleteRoom } from '@/lib/server/rooms/delete-room';
import { saveRoom } from '@/lib/server/rooms/save-room';
import { goToCamp } from '../../../../_components/go-to';

export const saveRoomAction = action({
  schema: roomSchema,
  permission: 'camp.edit',
  on: { kind: 'camp', field: 'campId' },
  run: saveRoom,
  onOk: (_, { campId, roomId }) => goToCamp(campId, '/rooms', roomId ? 'saved' : 'added'),
});

export const deleteRoomAction = action({
  schema: roomRowSchema,
  permission: 'camp.edit',
  on: { kind: 'camp', field: 'campId' },
  run: deleteRoom,
  onOk: (_, { campId }) => goToCamp(campId, '/rooms', 'deleted'),
});
