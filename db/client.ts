import { mkdirSync } from 'node:fs';
import { dirname } from 'node:path';
import Database from 'better-sqlite3';
import { drizzle } from 'drizzle-orm/better-sqlite3';
import * as account from './schema/account';
import * as audit from './schema/audit';
import * as background from './schema/background';
import * as camp from './schema/camp';
import * as door from './schema/door';
import * as mail from './schema/mail';
import * as money from './schema/money';
import * as order from './schema/order';
import * as organisation from './schema/organisation';
import * as workshop from './schema/workshop';

const schema = {
  ...account,
  ...audit,
  ...background,
  ...camp,
  ...door,
  ...mail,
  ...money,
  ...order,
  ...organisation,
  ...workshop,
};

/**
 * Opens the database file (made when absent; tables come by `migrateDatabase`).
 * WAL with `synchronous=FULL`: an acknowledged write is on disk, which NORMAL does not promise after a power cut.
 */
export function openDatabase(file: string) {
  mkdirSync(dirname(file), { recursive: true });
  const sqlite = new Database(file, { timeout: 10_000 });
  sqlite.pragma('journal_mode = WAL');
  sqlite.pragma('synchronous = FULL');
  sqlite.pragma('foreign_keys = ON');
  return drizzle(sqlite, { schema });
}

export type Db = ReturnType<typeof openDatabase>;
/** What a transaction's callback gets; a use-case that takes `Tx | Db` works in both. */
export type Tx = Parameters<Parameters<Db['transaction']>[0]>[0];
