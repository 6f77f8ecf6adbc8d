import 'server-only';
import { lt } from 'drizzle-orm';
import { draft } from '@/db/schema/order';
import { getDb } from '../db';
import { DRAFT_DAYS } from './draft-cookie';

/** Deletes answers that nobody came back to. */
export function purgeDrafts(now: number): number {
  const before = now - DRAFT_DAYS * 24 * 60 * 60_000;
  return getDb().delete(draft).where(lt(draft.updatedAt, before)).run().changes;
}
