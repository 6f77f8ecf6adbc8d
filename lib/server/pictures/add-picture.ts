import 'server-only';
import { campPicture } from '@/db/schema/camp';
import { CAMP_LIMITS } from '@/lib/domain/camp/camp-limits';
import type { Id } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { AddPictureInput } from '@/lib/schemas/picture';
import { editOwnCamp } from '../camps/edit-own-camp';
import { ownCamp } from '../camps/own-camp';
import { endOf } from '../camps/own-rows';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { newId } from '../new-id';
import { encodePicture } from './encode-picture';
import { removePictureFile, writePictureFile } from './picture-file';

/**
 * Takes an upload: re-encoded, on disk, then the row; a row that is refused takes the file away again. A crash between
 * the two leaves a file without a row, which the sweep removes; a row without a file cannot be.
 */
export async function addPicture(
  { campId, alt, file }: AddPictureInput,
  context: Pick<Context, 'actor' | 'now'>,
): Promise<Result<{ pictureId: Id<'pic'> }, Refusal>> {
  // Asked before the costly decoding, and once more with the row.
  if (!ownCamp(context.actor, campId, 'camp.edit')) return refuse('not_found');
  const encoded = await encodePicture(new Uint8Array(await file.arrayBuffer()));
  if (!encoded.ok) return refuse('bad_input', { fields: { file: [encoded.error] } });
  const { content, width, height } = encoded.value;
  const id = newId('pic', context.now);
  await writePictureFile(id, content);
  let kept = false;
  try {
    const added = editOwnCamp(campId, context, (tx) => {
      const end = endOf(tx, 'pictures', campId);
      if (end.rows >= CAMP_LIMITS.pictures)
        return refuse('bad_input', {
          sentence: `A camp has at most ${CAMP_LIMITS.pictures} pictures. Delete one first.`,
        });
      tx.insert(campPicture)
        .values({ id, campId, alt, width, height, position: end.position, createdAt: context.now })
        .run();
      return ok({
        value: { pictureId: id },
        action: 'picture.add',
        subjectId: id,
        sentence: `Added a picture: ${alt}`,
      });
    });
    kept = added.ok;
    return added;
  } finally {
    if (!kept) await removePictureFile(id);
  }
}
