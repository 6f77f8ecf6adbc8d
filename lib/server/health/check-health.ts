import 'server-only';
import { pendingMigrations } from '@/db/migrate';
import { getDb } from '../db';
import { log } from '../log';

/** Null when requests can be served; else a sentence for whoever watches the server, without paths or values. */
export function checkHealth(): string | null {
  try {
    const pending = pendingMigrations(getDb());
    return pending === 0
      ? null
      : `The database lacks ${pending} migration${pending === 1 ? '' : 's'}. Restart to apply them.`;
  } catch (error) {
    log.error(
      { err: error instanceof Error ? { name: error.name, message: error.message } : error },
      'unhealthy',
    );
    return 'The database does not answer. The log says why.';
  }
}
