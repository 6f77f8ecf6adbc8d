import 'server-only';
import { readdir, rm, stat } from 'node:fs/promises';
import { join } from 'node:path';
import { inArray } from 'drizzle-orm';
import { campPicture } from '@/db/schema/camp';
import { type Id, isId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';
import { pictureFolder } from './picture-file';

/** Uploads take seconds; a file this old without a row is left over from a crash. */
const OLD_MS = 3_600_000;

/** Removes files that no row points to. Says how many. */
export async function sweepPictures(now: number): Promise<number> {
  const names = await readdir(pictureFolder()).catch((): string[] => []);
  const idOf = (name: string): Id<'pic'> | null => {
    const id = name.split('.')[0] ?? '';
    return isId('pic', id) ? id : null;
  };
  const ids = names.flatMap((name) => idOf(name) ?? []);
  const known = new Set<string>();
  for (let at = 0; at < ids.length; at += 500)
    for (const row of getDb()
      .select({ id: campPicture.id })
      .from(campPicture)
      .where(inArray(campPicture.id, ids.slice(at, at + 500)))
      .all())
      known.add(row.id);
  let removed = 0;
  for (const name of names) {
    const id = idOf(name);
    if (!id || (known.has(id) && name === `${id}.webp`)) continue;
    const file = join(pictureFolder(), name);
    const age = now - ((await stat(file).catch(() => null))?.mtimeMs ?? now);
    if (age < OLD_MS) continue;
    await rm(file, { force: true });
    removed += 1;
  }
  return removed;
}
