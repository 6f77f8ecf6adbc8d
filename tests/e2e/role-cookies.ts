import { spawnSync } from 'node:child_process';
import { createHash, randomBytes } from 'node:crypto';
import Database from 'better-sqlite3';
import { type DemoRole, emailOf } from './sign-in';

export const openRows = () => new Database(process.env.COMBWOOD_DB ?? '', { timeout: 10_000 });

/** Who sends: nobody signed in, a demo account, or the organiser of another organisation. */
export type Sender = 'visitor' | DemoRole | 'second';
export const SENDERS = [
  'visitor',
  'attendee',
  'door',
  'instructor',
  'treasurer',
  'organiser',
  'second',
] as const;

/** Makes the second organisation where it is missing, and signs everybody in past the form: a cookie for each. */
export function makeCookies(): Record<Sender, string> {
  const db = openRows();
  try {
    if (!db.prepare("select 1 from organisation where id = 'org_second'").get()) {
      const env = { ...process.env, TSX_TSCONFIG_PATH: 'tests/setup/tsconfig.json' };
      const made = spawnSync(process.execPath, ['--import', 'tsx', 'tests/e2e/second-organisation.ts'], {
        env,
        encoding: 'utf8',
      });
      if (made.status !== 0) throw new Error(made.stderr);
    }
    const add = db.prepare('insert into session values (?, ?, ?, ?, ?, ?)');
    const cookieOf = (email: string): string => {
      const { id } = db.prepare('select id from user where email = ?').get(email) as { id: string };
      const token = randomBytes(20).toString('base64url');
      const now = Date.now();
      const key = createHash('sha256').update(token).digest('base64url');
      add.run(key, id, Math.floor(now / 1000) + 3600, now + 3_600_000, now, 'Test');
      return `combwood_session=${token}`;
    };
    return {
      visitor: '',
      attendee: cookieOf(emailOf('attendee')),
      door: cookieOf(emailOf('door')),
      instructor: cookieOf(emailOf('instructor')),
      treasurer: cookieOf(emailOf('treasurer')),
      organiser: cookieOf(emailOf('organiser')),
      second: cookieOf('usr_second@example.test'),
    };
  } finally {
    db.close();
  }
}
