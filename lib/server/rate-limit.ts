import 'server-only';
import { createHash } from 'node:crypto';
import { RateLimiterSQLite } from 'rate-limiter-flexible';
import { getDb } from './db';
import { env } from './env';
import { log } from './log';

/** Points a window in seconds, by what is asked for. Keys are an address or an account, never both in one bucket. */
const BUDGETS = {
  'sign-in-address': { points: 30, seconds: 900 },
  'sign-in-account': { points: 8, seconds: 900 },
  'sign-up': { points: 12, seconds: 3600 },
  'mail-link': { points: 5, seconds: 3600 },
  draft: { points: 240, seconds: 600 },
  order: { points: 20, seconds: 600 },
  upload: { points: 60, seconds: 3600 },
  edit: { points: 600, seconds: 600 },
  export: { points: 30, seconds: 600 },
  read: { points: 1200, seconds: 600 },
  scan: { points: 3000, seconds: 600 },
} as const satisfies Record<string, { points: number; seconds: number }>;

export type Budget = keyof typeof BUDGETS;

const limiters = new Map<Budget, Promise<RateLimiterSQLite>>();

function open(budget: Budget): Promise<RateLimiterSQLite> {
  const { points, seconds } = BUDGETS[budget];
  return new Promise((resolve, reject) => {
    const limiter: RateLimiterSQLite = new RateLimiterSQLite(
      {
        storeClient: getDb().$client,
        storeType: 'better-sqlite3',
        tableName: 'rate_limit',
        keyPrefix: budget,
        points: points * env().RATE_LIMIT_SCALE,
        duration: seconds,
        // Below this many tries the memory answers; SQLite counts the rest, so that a restart forgives nothing.
        clearExpiredByTimeout: true,
      },
      (error?: Error) => (error ? reject(error) : resolve(limiter)),
    );
  });
}

/** Takes one point; false when the budget is spent. Keys are hashed: the table holds no addresses or e-mails. */
export async function spend(budget: Budget, key: string): Promise<boolean> {
  let limiter = limiters.get(budget);
  if (!limiter) {
    limiter = open(budget);
    limiters.set(budget, limiter);
  }
  const ready = await limiter;
  try {
    await ready.consume(createHash('sha256').update(key).digest('base64url').slice(0, 22));
    return true;
  } catch (refusal) {
    if (refusal instanceof Error) throw refusal;
    log.warn({ budget }, 'rate limit reached');
    return false;
  }
}
