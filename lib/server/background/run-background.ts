import 'server-only';
import { randomUUID } from 'node:crypto';
import { log } from '../log';
import { holdLease, releaseLease } from './hold-lease';
import type { Job } from './job';

const TICK = 1_000;
const LEASE = 'background';

// On globalThis, because a reload in development evaluates this module again and must not start a second loop.
const running = globalThis as typeof globalThis & { combwoodBackground?: { jobs: Job[] } };

/** Runs what is due of `jobs`, one after the other; a job that breaks is logged and does not hold up the rest. */
export async function runDueJobs(jobs: Job[], due: Map<string, number>, now: () => number): Promise<void> {
  for (const job of jobs) {
    const at = now();
    if ((due.get(job.name) ?? 0) > at) continue;
    due.set(job.name, at + job.everyMs);
    try {
      const done = await job.run(at);
      if (done > 0) log.info({ job: job.name, done }, 'background');
    } catch (error) {
      const err = error instanceof Error ? { name: error.name, message: error.message } : String(error);
      log.error({ job: job.name, err }, 'background job broke');
    }
  }
}

/**
 * The one loop of this process. Of several processes on one database only the holder of the lease works, so nothing
 * is asked of the payment service or the mail server twice at the same time.
 */
export function runBackground(jobs: Job[]): void {
  if (running.combwoodBackground) {
    running.combwoodBackground.jobs = jobs;
    return;
  }
  const state = { jobs };
  running.combwoodBackground = state;
  const holder = randomUUID();
  const due = new Map<string, number>();
  const tick = async (): Promise<void> => {
    try {
      if (holdLease(LEASE, holder, Date.now())) await runDueJobs(state.jobs, due, Date.now);
    } catch (error) {
      log.error({ err: error instanceof Error ? error.message : String(error) }, 'background loop');
    }
    setTimeout(tick, TICK).unref();
  };
  setTimeout(tick, TICK).unref();
  // Long jobs keep the lease by this second timer.
  setInterval(() => {
    try {
      holdLease(LEASE, holder, Date.now());
    } catch {
      // The next tick says so.
    }
  }, 4_000).unref();
  process.once('exit', () => {
    try {
      releaseLease(LEASE, holder);
    } catch {
      // The lease runs out by itself.
    }
  });
}
