import 'server-only';
import { after } from 'next/server';
import { log } from './log';

/**
 * Runs once the answer is on its way. For work whose time would tell a stranger something, such as whether an address
 * is known: the answer has left before it is looked up (ASVS 6.3.8).
 */
export function later(requestId: string, run: () => void | Promise<void>): void {
  after(async () => {
    try {
      await run();
    } catch (error) {
      log.error({ requestId, err: error instanceof Error ? error.stack : String(error) }, 'broken, later');
    }
  });
}
