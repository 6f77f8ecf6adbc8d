'use server';

import { trackRowSchema, trackSchema } from '@/lib/schemas/track';
import { action } from '@/lib/server/action';
import { deleteTrack } from '@/lib/server/tracks/delete-track';
import { saveTrack } from '@/lib/server/tracks/save-track';
import { goToCamp } from '../../../../_components/go-to';

export const saveTrackAction = action({
  schema: trackSchema,
  permission: 'camp.edit',
  on: { kind: 'camp', field: 'campId' },
  run: saveTrack,
  onOk: (_, { campId, trackId }) => goToCamp(campId, '/tracks', trackId ? 'saved' : 'added'),
});

export const deleteTrackAction = action({
  schema: trackRowSchema,
  permission: 'camp.edit',
  on: { kind: 'camp', field: 'campId' },
  run: deleteTrack,
  onOk: (_, { campId }) => goToCamp(campId, '/tracks', 'deleted'),
});
