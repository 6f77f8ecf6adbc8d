import 'server-only';
import { type Db, openDatabase, type Tx } from '@/db/client';
import { env } from './env';

export type { Db, Tx };

// On globalThis, because a reload in development evaluates this module again and must not open a second connection.
const held = globalThis as typeof globalThis & { combwoodDb?: Db };

/** The one connection of this process. better-sqlite3 is synchronous, so one serves every request. */
export function getDb(): Db {
  held.combwoodDb ??= openDatabase(env().COMBWOOD_DB);
  return held.combwoodDb;
}

/**
 * A write transaction that takes the lock at once: read → decide → write, synchronous, no network inside.
 * `deferred` (Drizzle's default) fails with SQLITE_BUSY_SNAPSHOT when two read before either writes.
 */
export function inTransaction<T>(run: (tx: Tx) => T): T {
  return getDb().transaction(run, { behavior: 'immediate' });
}
