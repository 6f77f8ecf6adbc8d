import 'server-only';
import { readFile } from 'node:fs/promises';
import { eq } from 'drizzle-orm';
import { camp, campPicture } from '@/db/schema/camp';
import type { Actor } from '@/lib/domain/access/actor';
import { can } from '@/lib/domain/access/can';
import type { Id } from '@/lib/domain/shared/ids';
import { getDb } from '../db';
import { log } from '../log';
import { pictureFile } from './picture-file';

/** A picture's bytes where the actor may see them: anyone once the camp is public, staff of the camp before. */
export async function findPicture(
  id: Id<'pic'>,
  actor: Actor,
): Promise<{ content: Uint8Array<ArrayBuffer>; open: boolean } | null> {
  const row = getDb()
    .select({ state: camp.state, organisationId: camp.organisationId })
    .from(campPicture)
    .innerJoin(camp, eq(camp.id, campPicture.campId))
    .where(eq(campPicture.id, id))
    .get();
  if (!row) return null;
  const open = row.state !== 'draft';
  if (!open && !can(actor, 'camp.read', row)) return null;
  try {
    return { content: new Uint8Array(await readFile(pictureFile(id))), open };
  } catch (error) {
    log.error({ pictureId: id, err: error instanceof Error ? error.message : String(error) }, 'picture file');
    return null;
  }
}
