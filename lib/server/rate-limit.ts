import 'server-only';
import { createHash } from 'node:crypto';
import { RateLimiterMemory, RateLimiterSQLite } from 'rate-limiter-flexible';
import { type Db, getDb } from './db';
import { env } from './env';
import { log } from './log';

/** Points a window in seconds, by what is asked for. Keys are an address or an account, never both in one bucket. */
const BUDGETS = {
  // Wrong tries only: right ones are given back, because a whole camp signs in from one address.
  'sign-in-address': { points: 30, seconds: 900 },
  // By account and device, or account and address.
  'sign-in-account': { points: 8, seconds: 900 },
  // By account, all devices together that never signed in to it: caps guessing from many addresses at once.
  'sign-in-strangers': { points: 60, seconds: 3600 },
  // By address: accounts opened, and links asked for. A camp's hall may be one address.
  'sign-up': { points: 60, seconds: 3600 },
  // By mailbox: how many letters of ours anybody can cause to one person.
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

// These only keep one client from wearing the server out, and are spent with every click: counted in memory, because
// in SQLite each would wait for the disk once more. What guards a secret, a mailbox, money or the disk outlives a restart.
const IN_MEMORY: ReadonlySet<Budget> = new Set(['draft', 'edit', 'read', 'scan']);

type Limiter = RateLimiterMemory | RateLimiterSQLite;

// By connection, so that a test with a database of its own counts in that one.
const limiters = new WeakMap<Db, Map<Budget, Promise<Limiter>>>();

async function open(budget: Budget): Promise<Limiter> {
  const { points, seconds } = BUDGETS[budget];
  if (IN_MEMORY.has(budget))
    return new RateLimiterMemory({ points: points * env().RATE_LIMIT_SCALE, duration: seconds });
  return new Promise((resolve, reject) => {
    const limiter: RateLimiterSQLite = new RateLimiterSQLite(
      {
        storeClient: getDb().$client,
        storeType: 'better-sqlite3',
        tableName: 'rate_limit',
        keyPrefix: budget,
        points: points * env().RATE_LIMIT_SCALE,
        duration: seconds,
        clearExpiredByTimeout: true,
      },
      (error?: Error) => (error ? reject(error) : resolve(limiter)),
    );
  });
}

function limiterOf(budget: Budget): Promise<Limiter> {
  const held = limiters.get(getDb()) ?? new Map<Budget, Promise<Limiter>>();
  limiters.set(getDb(), held);
  const limiter = held.get(budget) ?? open(budget);
  held.set(budget, limiter);
  return limiter;
}

/** Keys are hashed: neither table nor memory holds addresses or e-mails. */
const keyOf = (text: string): string => createHash('sha256').update(text).digest('base64url').slice(0, 22);

/** Takes one point; false when the budget is spent. */
export async function spend(budget: Budget, key: string): Promise<boolean> {
  const limiter = await limiterOf(budget);
  try {
    await limiter.consume(keyOf(key));
    return true;
  } catch (refusal) {
    if (refusal instanceof Error) throw refusal;
    log.warn({ budget }, 'rate limit reached');
    return false;
  }
}

/** Returns a point that turned out to be well spent. */
export async function giveBack(budget: Budget, key: string): Promise<void> {
  await (await limiterOf(budget)).reward(keyOf(key));
}
