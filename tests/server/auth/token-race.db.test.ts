import { type ChildProcessWithoutNullStreams, spawn } from 'node:child_process';
import { expect, test } from 'vitest';
import { emailToken } from '@/db/schema/account';
import { makeEmailToken } from '@/lib/server/auth/email-tokens';
import { inTransaction } from '@/lib/server/db';
import { buildUser } from '../../builders/build-user';
import { useTestDatabase } from '../../setup/test-database';

const database = useTestDatabase();
const PROCESSES = 4;

const start = (): ChildProcessWithoutNullStreams =>
  spawn(process.execPath, ['--import', 'tsx', 'tests/server/auth/spend-token-process.ts'], {
    env: { ...process.env, TSX_TSCONFIG_PATH: 'tests/setup/tsconfig.json', COMBWOOD_DB: database.file },
  });
const says = (child: ChildProcessWithoutNullStreams) =>
  new Promise<string>((resolve, reject) => {
    child.stdout.once('data', (text: Buffer) => resolve(text.toString().trim()));
    child.stderr.once('data', (text: Buffer) => reject(new Error(text.toString())));
  });

// ASVS 5.0, 6.5.1: single use, also when several processes serve the same database.
test('of several processes that spend one link, one gets it', async () => {
  const userId = buildUser(database.db);
  const token = inTransaction((tx) =>
    makeEmailToken(tx, { userId, kind: 'reset', email: 'a@example.test', now: Date.now() }),
  );
  const children = Array.from({ length: PROCESSES }, start);
  expect(await Promise.all(children.map(says))).toEqual(Array(PROCESSES).fill('ready'));
  const answers = Promise.all(children.map(says));
  for (const child of children) child.stdin.write(`${token}\n`);
  expect((await answers).sort()).toEqual(['got', ...Array(PROCESSES - 1).fill('none')]);
  expect(database.db.select().from(emailToken).get()?.usedAt).toBeTypeOf('number');
}, 90_000);
