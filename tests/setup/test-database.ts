import { copyFileSync, existsSync, mkdtempSync, renameSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach } from 'vitest';
import { type Db, openDatabase } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';

const held = globalThis as typeof globalThis & { combwoodDb?: Db };
const base = join(tmpdir(), `combwood-base-${process.ppid}.db`);

/** One migrated file a test run; each test gets a copy, which is quicker than migrating and just as real. */
function migratedBase(): string {
  if (existsSync(base)) return base;
  const making = `${base}.${process.pid}`;
  const db = openDatabase(making);
  migrateDatabase(db);
  db.$client.pragma('wal_checkpoint(TRUNCATE)');
  db.$client.close();
  renameSync(making, base);
  return base;
}

/** Gives every test of the file a database of its own, which `getDb()` finds. */
export function useTestDatabase(): { readonly db: Db; readonly file: string } {
  let folder = '';
  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'combwood-test-'));
    const file = join(folder, 'test.db');
    copyFileSync(migratedBase(), file);
    process.env.COMBWOOD_DB = file;
    held.combwoodDb = openDatabase(file);
  });
  afterEach(() => {
    held.combwoodDb?.$client.close();
    delete held.combwoodDb;
    rmSync(folder, { recursive: true, force: true });
  });
  return {
    get db() {
      if (!held.combwoodDb) throw new Error('Only inside a test');
      return held.combwoodDb;
    },
    get file() {
      return join(folder, 'test.db');
    },
  };
}
