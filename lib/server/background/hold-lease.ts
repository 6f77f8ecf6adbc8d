import 'server-only';
import { and, eq, lte, or } from 'drizzle-orm';
import { lease } from '@/db/schema/background';
import { getDb, inTransaction } from '../db';

const LASTS = 15_000;
/** Renewed with a third of its time gone, so that a slow moment does not lose it. */
const RENEW_BEFORE = 10_000;

/**
 * True when `holder` may work now. One write each few seconds at most: a valid lease is only read. Work under a lease
 * must still bear being done twice, as a stopped process may wake up after its lease has gone to another.
 */
export function holdLease(name: string, holder: string, now: number): boolean {
  const row = getDb().select().from(lease).where(eq(lease.name, name)).get();
  if (row && row.until > now) {
    if (row.holder !== holder) return false;
    if (row.until - now > RENEW_BEFORE) return true;
  }
  return inTransaction((tx) => {
    const until = now + LASTS;
    const taken = tx
      .insert(lease)
      .values({ name, holder, until })
      .onConflictDoUpdate({
        target: lease.name,
        set: { holder, until },
        setWhere: or(eq(lease.holder, holder), lte(lease.until, now)),
      })
      .run();
    return taken.changes === 1;
  });
}

/** At the end of a process, so that the next one starts its work at once. */
export function releaseLease(name: string, holder: string): void {
  getDb()
    .delete(lease)
    .where(and(eq(lease.name, name), eq(lease.holder, holder)))
    .run();
}
