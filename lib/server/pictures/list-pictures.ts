import 'server-only';
import { asc, eq } from 'drizzle-orm';
import { campPicture } from '@/db/schema/camp';
import type { CampId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';

/** A camp's pictures in their order. Callers have asked who may see the camp. */
export const listPictures = (campId: CampId): (typeof campPicture.$inferSelect)[] =>
  getDb()
    .select()
    .from(campPicture)
    .where(eq(campPicture.campId, campId))
    .orderBy(asc(campPicture.position), asc(campPicture.id))
    .all();
