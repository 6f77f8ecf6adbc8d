import { z } from 'zod';
import { ok } from '@/lib/domain/shared/result';
import { rowId } from '@/lib/schemas/row-id';
import { refuse } from '@/lib/server/errors';
import { findPicture } from '@/lib/server/pictures/find-picture';
import { pictureResponse } from '@/lib/server/pictures/picture-response';
import { route } from '@/lib/server/route';

/** A camp's picture; before the camp is public only its staff get it, and nothing on the way keeps a copy. */
export const GET = route({
  schema: z.object({ params: z.object({ pictureId: rowId('pic') }) }),
  permission: 'public.read',
  run: async ({ params }, { actor }) => {
    const picture = await findPicture(params.pictureId, actor);
    return picture ? ok(pictureResponse(picture)) : refuse('not_found');
  },
});
