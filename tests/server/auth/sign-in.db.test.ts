import { beforeEach, describe, expect, test, vi } from 'vitest';
import { signInAction } from '@/app/(account)/sign-in/actions';
import { session, user } from '@/db/schema/account';
import { hashPassword } from '@/lib/server/auth/hash-password';
import { knownDevice, withKnownDevice } from '@/lib/server/auth/known-device';
import { verifyPassword } from '@/lib/server/auth/verify-password';
import { buildAccount, PASSWORD } from '../../builders/build-account';
import { fakeRequest, newBrowser, useFakeRequest } from '../../setup/fake-request';
import { runAction } from '../../setup/run-action';
import { useTestDatabase } from '../../setup/test-database';

vi.mock('next/headers', async () => (await import('../../setup/fake-request')).nextHeaders);

const database = useTestDatabase();
useFakeRequest();
beforeEach(async () => {
  await buildAccount(database.db);
});

const tryIn = (email: string, password: string, more: Record<string, string> = {}) =>
  runAction(signInAction, { email, password, ...more });

test('passwords are kept as Argon2id, m=19456 t=2 p=1 (11.4.2)', async () => {
  expect(await hashPassword('x')).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
});

test('nothing of a password is cut off, changed or folded (6.2.8)', async () => {
  const long = `${'walnut '.repeat(28)}x`;
  const stored = await hashPassword(long);
  expect(await verifyPassword(stored, long)).toBe(true);
  expect(await verifyPassword(stored, long.slice(0, -1))).toBe(false);
  expect(await verifyPassword(stored, long.toUpperCase())).toBe(false);
  expect(await verifyPassword(stored, ` ${long}`)).toBe(false);
});

test('é typed as one sign or two is the same password', async () => {
  expect(await verifyPassword(await hashPassword('caf\u00e9 caf\u00e9'), 'cafe\u0301 cafe\u0301')).toBe(true);
});

test.each(['!', '', 'plain', '$argon2id$broken'])('a stored %j lets nobody in', async (stored) => {
  await expect(verifyPassword(stored, stored).catch(() => false)).resolves.toBe(false);
});

test('lands by role, or where one was going', async () => {
  expect((await tryIn(' Noor@Example.test ', PASSWORD)).to).toBe('/my');
  expect((await tryIn('noor@example.test', PASSWORD, { next: '/my/orders/ord_1' })).to).toBe(
    '/my/orders/ord_1',
  );
});

test.each([
  '//evil.example',
  '/\\evil.example',
  'https:evil.example',
  'https://evil.example',
  '/.//evil.example',
])('never leads to %s (3.7.2)', async (next) =>
  expect((await tryIn('noor@example.test', PASSWORD, { next })).to).toBe('/my'),
);

test('unknown, wrong and closed say the same (6.3.8)', async () => {
  await buildAccount(database.db, 'closed', { disabledAt: 1 });
  const said = [
    await tryIn('nobody@example.test', PASSWORD),
    await tryIn('noor@example.test', 'wrong reed walnut'),
    await tryIn('closed@example.test', PASSWORD),
  ];
  const [first] = said;
  expect(first?.sentence).toMatch(/do not belong together/);
  for (const { sentence, fields, to } of said)
    expect({ sentence, fields, to }).toEqual({ sentence: first?.sentence, fields: {}, to: null });
  expect(database.db.select().from(session).all()).toEqual([]);
});

test('unknown and known take as long (6.3.8)', async () => {
  const stored = await hashPassword(PASSWORD);
  const took = async (hash: string | null) => {
    const from = performance.now();
    await verifyPassword(hash, 'wrong reed walnut');
    return performance.now() - from;
  };
  // In turns, so that a busy moment of the machine falls on both.
  const known: number[] = [];
  const unknown: number[] = [];
  for (let n = 0; n < 11; n += 1) {
    known.push(await took(stored));
    unknown.push(await took(null));
  }
  const middle = (all: number[]) => all.sort((a, b) => a - b)[5] ?? 0;
  const ratio = middle(unknown) / middle(known);
  // Without the dummy hash the ratio is in the thousands; a busy machine blurs it, but not by that.
  expect(ratio).toBeGreaterThan(0.3);
  expect(ratio).toBeLessThan(3);
});

test('a password never comes back to the page', async () => {
  const { state } = await tryIn('noor@example.test', 'wrong reed walnut');
  expect(JSON.stringify(state)).not.toContain('walnut');
  expect(JSON.stringify(state)).toContain('noor@example.test');
});

test.each([
  [{ email: '', password: '' }, ['email', 'password']],
  [{ email: 'noor', password: 'x' }, ['email']],
  [{ email: 'a@b.test\r\nBcc: c@d.test', password: 'x' }, ['email']],
  [{ email: `${'a'.repeat(300)}@b.test`, password: 'x' }, ['email']],
  [{ email: 'a@b.test', password: 'x'.repeat(5000) }, ['password']],
])('names what is wrong in %j', async (given, names) => {
  expect(Object.keys((await runAction(signInAction, given)).fields)).toEqual(names);
});

test('extra fields change nothing (15.3.3)', async () => {
  await tryIn('noor@example.test', PASSWORD, {
    role: 'organiser',
    emailVerifiedAt: '1',
    id: 'usr_x',
    disabledAt: '1',
  });
  expect(database.db.select().from(user).get()).toMatchObject({ id: 'usr_noor', disabledAt: null });
});

describe('guessing (6.3.1)', () => {
  const guess = async (times: number, email = 'noor@example.test', from = () => '198.51.100.7') => {
    let last = '';
    for (let n = 0; n < times; n += 1) {
      newBrowser(from());
      last = (await tryIn(email, `wrong reed ${n}`)).sentence;
    }
    return last;
  };

  test('one address is stopped after eight tries at an account, with the right password too', async () => {
    await guess(8);
    expect(await guess(1)).toMatch(/lot of tries/);
    newBrowser('198.51.100.7');
    expect((await tryIn('noor@example.test', PASSWORD)).sentence).toMatch(/lot of tries/);
  });

  test('an unknown account is stopped alike (6.3.8)', async () => {
    expect(await guess(9, 'nobody@example.test')).toMatch(/lot of tries/);
  });

  test('the owner gets in meanwhile from another address', async () => {
    await guess(12);
    newBrowser('203.0.113.5');
    expect((await tryIn('noor@example.test', PASSWORD)).to).toBe('/my');
  });

  test('many addresses together are stopped too, and the owner’s own browser still gets in', async () => {
    await tryIn('noor@example.test', PASSWORD);
    const device = fakeRequest.jar.get('combwood_device') ?? '';
    let n = 0;
    const many = () => {
      n += 1;
      return `198.51.100.${n}`;
    };
    expect(await guess(61, 'noor@example.test', many)).toMatch(/lot of tries/);
    newBrowser('198.51.100.1');
    fakeRequest.jar.set('combwood_device', device);
    expect((await tryIn('noor@example.test', PASSWORD)).to).toBe('/my');
  });

  test('a camp’s hall signs in from one address: right passwords cost nothing', async () => {
    for (let n = 0; n < 35; n += 1) {
      newBrowser('198.51.100.7');
      expect((await tryIn('noor@example.test', PASSWORD)).to).toBe('/my');
    }
  }, 60_000);
});

test('a device’s cookie is good for its own account only and cannot be made up', () => {
  const cookie = withKnownDevice(undefined, 'noor@example.test');
  const nonce = knownDevice(cookie, 'noor@example.test');
  expect(nonce).toBeTruthy();
  expect(knownDevice(cookie, 'mei@example.test')).toBeNull();
  expect(knownDevice(`${nonce}.${'A'.repeat(22)}`, 'noor@example.test')).toBeNull();
  expect(knownDevice(`x${cookie}`, 'noor@example.test')).toBeNull();
  expect(knownDevice(undefined, 'noor@example.test')).toBeNull();
  const both = withKnownDevice(cookie, 'mei@example.test');
  expect([knownDevice(both, 'mei@example.test'), knownDevice(both, 'noor@example.test')]).toEqual([
    nonce,
    nonce,
  ]);
});
