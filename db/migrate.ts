import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { sql } from 'drizzle-orm';
import { migrate } from 'drizzle-orm/better-sqlite3/migrator';
import type { Db } from './client';

const folder = () => join(process.cwd(), 'db', 'migrations');

/** Brings the tables up to date; does nothing where they are. */
export function migrateDatabase(db: Db): void {
  migrate(db, { migrationsFolder: folder() });
}

/** How many migrations the code has that the database lacks; throws when the database does not answer. */
export function pendingMigrations(db: Db): number {
  const journal = join(folder(), 'meta', '_journal.json');
  if (!existsSync(journal)) throw new Error('The migrations folder is missing');
  const known = (JSON.parse(readFileSync(journal, 'utf8')) as { entries: unknown[] }).entries.length;
  const table = db.get<{ n: number }>(
    sql`select count(*) as n from sqlite_master where type = 'table' and name = '__drizzle_migrations'`,
  );
  if (!table?.n) return known;
  const applied = db.get<{ n: number }>(sql`select count(*) as n from __drizzle_migrations`)?.n ?? 0;
  return Math.max(0, known - applied);
}
