import 'server-only';
import { asc, eq } from 'drizzle-orm';
import { track } from '@/db/schema/camp';
import type { CampId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';

/** Names to filter by, in the organiser's order. */
export const listTracks = (campId: CampId) =>
  getDb()
    .select({ id: track.id, name: track.name })
    .from(track)
    .where(eq(track.campId, campId))
    .orderBy(asc(track.position), asc(track.id))
    .all();
