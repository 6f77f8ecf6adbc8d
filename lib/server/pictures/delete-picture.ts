import 'server-only';
import { and, eq } from 'drizzle-orm';
import { campPicture } from '@/db/schema/camp';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { PictureRowInput } from '@/lib/schemas/picture';
import { editOwnCamp } from '../camps/edit-own-camp';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { removePictureFile } from './picture-file';

/** The row first, then the file: what a crash leaves behind is a file that nobody points to, and the sweep finds it. */
export async function deletePicture(
  { campId, pictureId }: PictureRowInput,
  context: Pick<Context, 'actor' | 'now'>,
): Promise<Result<{ deleted: string }, Refusal>> {
  const gone = editOwnCamp(campId, context, (tx) => {
    const own = and(eq(campPicture.id, pictureId), eq(campPicture.campId, campId));
    const row = tx.select().from(campPicture).where(own).get();
    if (!row) return refuse('not_found');
    tx.delete(campPicture).where(own).run();
    return ok({
      value: { deleted: pictureId },
      action: 'picture.delete',
      subjectId: pictureId,
      sentence: `Deleted a picture: ${row.alt}`,
    });
  });
  if (gone.ok) await removePictureFile(pictureId);
  return gone;
}
