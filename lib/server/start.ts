import 'server-only';
import { migrateDatabase } from '@/db/migrate';
import { getDb } from './db';
import { env } from './env';
import { log } from './log';
import { markRequests } from './peer-address';

/** What must be true before the first request; a failure is told in words and ends the process. */
export function start(): void {
  try {
    env();
    migrateDatabase(getDb());
  } catch (error) {
    process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
    process.exit(1);
  }
  markRequests();
  log.info({ mode: env().COMBWOOD_MODE }, 'started');
}
