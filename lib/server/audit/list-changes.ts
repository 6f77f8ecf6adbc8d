import 'server-only';
import { desc, eq } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { audit } from '@/db/schema/audit';
import type { CampId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';

export type Change = { id: string; at: number; sentence: string; by: string | null };

/** What was done to a camp and by whom, latest first. Callers have asked who may see it. */
export const listChanges = (campId: CampId, most: number): Change[] =>
  getDb()
    .select({ id: audit.id, at: audit.at, sentence: audit.sentence, by: user.name })
    .from(audit)
    .leftJoin(user, eq(user.id, audit.actorUserId))
    .where(eq(audit.campId, campId))
    .orderBy(desc(audit.at), desc(audit.id))
    .limit(most)
    .all();
