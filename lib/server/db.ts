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

/**
 * Queries that are built and prepared once a connection instead of at every call, which for a query of a few rows
 * takes longer than running it. In a transaction they see what it wrote: this process has the one connection.
 */
export function preparedOnce<Queries extends object>(build: (db: Db) => Queries): () => Queries {
  const by = new WeakMap<Db, Queries>();
  return () => {
    const db = getDb();
    const known = by.get(db) ?? build(db);
    by.set(db, known);
    return known;
  };
}
