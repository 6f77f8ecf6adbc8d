import 'server-only';
import { and, eq } from 'drizzle-orm';
import { campPicture } from '@/db/schema/camp';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { EditPictureInput } from '@/lib/schemas/picture';
import { editOwnCamp } from '../camps/edit-own-camp';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';

/** Changes what is read aloud in a picture's place. */
export function editPicture(
  { campId, pictureId, alt }: EditPictureInput,
  context: Pick<Context, 'actor' | 'now'>,
): Result<{ pictureId: string }, Refusal> {
  return editOwnCamp(campId, context, (tx) => {
    const done = tx
      .update(campPicture)
      .set({ alt })
      .where(and(eq(campPicture.id, pictureId), eq(campPicture.campId, campId)))
      .run();
    if (done.changes === 0) return refuse('not_found');
    return ok({
      value: { pictureId },
      action: 'picture.edit',
      subjectId: pictureId,
      sentence: `Described a picture: ${alt}`,
    });
  });
}
