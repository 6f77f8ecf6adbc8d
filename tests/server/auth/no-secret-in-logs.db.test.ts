import { PassThrough } from 'node:stream';
import { beforeEach, expect, test, vi } from 'vitest';
import { user } from '@/db/schema/account';
import { PASSWORD } from '../../builders/build-account';
import { lettersOf } from '../../setup/account-letters';
import { fakeRequest, newBrowser, settled, useFakeRequest } from '../../setup/fake-request';
import { runAction } from '../../setup/run-action';
import { useTestDatabase } from '../../setup/test-database';

vi.mock('next/headers', async () => (await import('../../setup/fake-request')).nextHeaders);
vi.mock('next/server', async () => (await import('../../setup/fake-request')).nextServer);

const sink = vi.hoisted(() => ({ lines: [] as string[], options: {} as Record<string, unknown> }));
// The product's own pino with its own options, writing where the test can read.
vi.mock('pino', async (original) => {
  const real = await original<typeof import('pino')>();
  const stream = new PassThrough();
  stream.on('data', (part: Buffer) => sink.lines.push(part.toString()));
  const made = (options: import('pino').LoggerOptions) => {
    sink.options = { ...options };
    return real.pino({ ...options, level: 'trace' }, stream);
  };
  return { ...real, default: Object.assign(made, real.default) };
});

const database = useTestDatabase();
useFakeRequest();
beforeEach(() => {
  sink.lines.length = 0;
});

// ASVS 5.0, 16.2.5 and 14.2.4: what is logged names no secret and no person.
test('opening, proving, guessing, resetting and signing in leave no secret and no person in the log', async () => {
  const { signUpAction } = await import('@/app/(account)/sign-up/actions');
  const { verifyAction } = await import('@/app/(account)/verify/actions');
  const { askResetAction, resetAction } = await import('@/app/(account)/reset/actions');
  const { signInAction } = await import('@/app/(account)/sign-in/actions');
  const email = 'sam.okoro@example.test';
  const cookies = new Set<string>();
  const keep = () => {
    for (const { value } of fakeRequest.written) if (value) cookies.add(value);
  };
  await runAction(signUpAction, { name: 'Sam Okoro', email, password: PASSWORD });
  await settled();
  keep();
  await runAction(verifyAction, { token: lettersOf(database.db)[0]?.token ?? '' });
  keep();
  newBrowser('203.0.113.77');
  await runAction(askResetAction, { email });
  await settled();
  await runAction(resetAction, {
    token: lettersOf(database.db).at(-1)?.token ?? '',
    password: 'another walnut reed',
  });
  keep();
  newBrowser('203.0.113.77');
  await runAction(signInAction, { email, password: 'a wrong guess' });
  await runAction(signInAction, { email, password: 'another walnut reed' });
  for (let n = 0; n < 12; n += 1) {
    newBrowser('203.0.113.78');
    await runAction(signInAction, { email, password: `wrong guess ${n}` });
  }
  keep();

  const log = sink.lines.join('');
  expect(log).toContain('"msg":"signed in"');
  expect(log).toContain('"msg":"password reset"');
  expect(log).toContain('"msg":"rate limit reached"');
  const hash = database.db.select().from(user).get()?.passwordHash ?? 'none';
  const tokens = lettersOf(database.db).flatMap(({ token }) => (token ? [token] : []));
  expect(tokens.length).toBeGreaterThan(1);
  expect(cookies.size).toBeGreaterThan(2);
  for (const secret of [
    PASSWORD,
    'walnut',
    'wrong guess',
    hash,
    email,
    'okoro',
    'Okoro',
    '203.0.113.77',
    ...tokens,
    ...cookies,
  ])
    expect(log.includes(secret), `the log has ${secret.slice(0, 6)}…`).toBe(false);
});

test('the second net: a careless line is censored', async () => {
  const { log } = await import('@/lib/server/log');
  log.info(
    { password: 'walnut', token: 'tok123', user: { email: 'sam@example.test' }, cookie: 'c00kie' },
    'careless',
  );
  const line = sink.lines.join('');
  expect(line).toContain('careless');
  for (const secret of ['walnut', 'tok123', 'sam@example.test', 'c00kie']) expect(line).not.toContain(secret);
});

test('a line break in what is logged stays inside its line (16.4.1)', async () => {
  const { log } = await import('@/lib/server/log');
  log.info({ code: 'a\r\n{"level":60,"msg":"forged"}' }, 'one');
  expect(sink.lines.join('').trimEnd().split('\n')).toHaveLength(1);
});
