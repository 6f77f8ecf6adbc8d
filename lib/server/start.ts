import 'server-only';
import { migrateDatabase } from '@/db/migrate';
import { listJobs } from './background/list-jobs';
import { runBackground } from './background/run-background';
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
  runBackground(listJobs());
  log.info({ mode: env().COMBWOOD_MODE }, 'started');
}
