import { copyFileSync, mkdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { type Db, openDatabase } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';

const held = globalThis as typeof globalThis & { combwoodDb?: Db };
let made = 0;

/** A migrated file of its own, filled by `fill`. */
export function makeBase(folder: string, fill: (db: Db) => void): string {
  mkdirSync(folder, { recursive: true });
  made += 1;
  const file = join(folder, `base-${made}.db`);
  remove(file);
  const db = openDatabase(file);
  migrateDatabase(db);
  fill(db);
  db.$client.pragma('wal_checkpoint(TRUNCATE)');
  db.$client.close();
  return file;
}

/** Runs on a fresh copy of the file, which use-cases find as their own database. */
export async function withCopy<T>(base: string, run: (db: Db) => T | Promise<T>): Promise<T> {
  const file = `${base}.copy`;
  remove(file);
  copyFileSync(base, file);
  const db = openDatabase(file);
  held.combwoodDb = db;
  try {
    return await run(db);
  } finally {
    db.$client.close();
    delete held.combwoodDb;
    remove(file);
  }
}

function remove(file: string): void {
  for (const tail of ['', '-wal', '-shm']) rmSync(`${file}${tail}`, { force: true });
}
