import 'server-only';
import { randomBytes } from 'node:crypto';
import { copyFile, mkdir, open, rename, rm } from 'node:fs/promises';
import { join } from 'node:path';
import type { Id } from '@/lib/domain/shared/ids';
import { env } from '../env';

export const pictureFolder = (): string => join(env().COMBWOOD_FILES, 'pictures');

/** Where a picture lies. The name comes from our id alone, never from what was uploaded. */
export const pictureFile = (id: Id<'pic'>): string => join(pictureFolder(), `${id}.webp`);

/** Writes beside the place, brings it to disk, then renames: a reader sees all of a picture or none of it. */
export async function writePictureFile(id: Id<'pic'>, content: Uint8Array): Promise<void> {
  await mkdir(pictureFolder(), { recursive: true });
  const making = `${pictureFile(id)}.${randomBytes(6).toString('hex')}.part`;
  try {
    const file = await open(making, 'wx');
    try {
      await file.writeFile(content);
      await file.sync();
    } finally {
      await file.close();
    }
    await rename(making, pictureFile(id));
  } catch (error) {
    await rm(making, { force: true });
    throw error;
  }
}

export const copyPictureFile = (from: Id<'pic'>, to: Id<'pic'>): Promise<void> =>
  copyFile(pictureFile(from), pictureFile(to));

export const removePictureFile = (id: Id<'pic'>): Promise<void> => rm(pictureFile(id), { force: true });
