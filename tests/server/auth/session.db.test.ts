import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, test, vi } from 'vitest';
import { signInAction } from '@/app/(account)/sign-in/actions';
import { signOutAction, signOutEverywhereAction } from '@/app/(account)/sign-out/actions';
import { session, user } from '@/db/schema/account';
import { membership } from '@/db/schema/organisation';
import { endSession } from '@/lib/server/auth/end-session';
import { getActor } from '@/lib/server/auth/get-actor';
import { listSessions } from '@/lib/server/auth/list-sessions';
import { ABSOLUTE_MS, IDLE_DAYS } from '@/lib/server/auth/session-limits';
import { hashToken } from '@/lib/server/hash-token';
import { buildAccount, PASSWORD } from '../../builders/build-account';
import { buildCamp, NOW } from '../../builders/build-camp';
import { fakeRequest, newBrowser, useFakeRequest } from '../../setup/fake-request';
import { runAction } from '../../setup/run-action';
import { useTestDatabase } from '../../setup/test-database';

vi.mock('next/headers', async () => (await import('../../setup/fake-request')).nextHeaders);

const database = useTestDatabase();
useFakeRequest();
const DAY = 24 * 60 * 60 * 1000;
const COOKIE = 'combwood_session';

const signIn = () => runAction(signInAction, { email: 'noor@example.test', password: PASSWORD });
const rows = () => database.db.select().from(session).all();

beforeEach(async () => {
  await buildAccount(database.db);
  return () => vi.useRealTimers();
});

test('the cookie is out of reach of scripts and other sites (3.3.1, 3.3.3, 3.3.4)', async () => {
  await signIn();
  for (const name of [COOKIE, 'combwood_device']) {
    const set = fakeRequest.written.find((cookie) => cookie.name === name);
    expect(set?.flags).toMatchObject({ httpOnly: true, sameSite: 'lax', path: '/', secure: false });
    expect(set?.flags).not.toHaveProperty('domain');
  }
});

test('over https the cookies are __Host- and Secure (3.3.1, 3.3.3)', async () => {
  vi.resetModules();
  vi.stubEnv('BASE_URL', 'https://camps.example.org');
  const cookie = await import('@/lib/server/auth/session-cookie');
  expect(cookie.sessionCookieName()).toBe('__Host-combwood_session');
  expect(cookie.cookieFlags()).toEqual({ httpOnly: true, sameSite: 'lax', secure: true, path: '/' });
  vi.unstubAllEnvs();
  vi.resetModules();
});

test('the table holds the hash of the token, never the token (6.5.2)', async () => {
  await signIn();
  const token = fakeRequest.jar.get(COOKIE) ?? '';
  // 160 bits; ASVS 7.2.3 asks for 128 at least.
  expect(Buffer.from(token, 'base64url').length).toBeGreaterThanOrEqual(20);
  expect(rows().map((row) => row.id)).toEqual([hashToken(token)]);
  expect(JSON.stringify(rows())).not.toContain(token);
  fakeRequest.jar.set(COOKIE, hashToken(token));
  expect((await getActor()).user).toBeNull();
});

test('each sign-in has a new id, and what the browser held before ends (7.2.4)', async () => {
  await signIn();
  const first = fakeRequest.jar.get(COOKIE);
  await signIn();
  expect(fakeRequest.jar.get(COOKIE)).not.toBe(first);
  expect(rows()).toHaveLength(1);
});

test('a planted token is not adopted (7.2.4)', async () => {
  fakeRequest.jar.set(COOKIE, 'planted');
  await signIn();
  expect(fakeRequest.jar.get(COOKIE)).not.toBe('planted');
  expect(rows().map((row) => row.id)).not.toContain(hashToken('planted'));
});

describe('limits', () => {
  beforeEach(async () => {
    vi.useFakeTimers({ toFake: ['Date'], now: NOW });
    await signIn();
  });
  const at = async (ms: number) => {
    vi.setSystemTime(NOW + ms);
    return (await getActor()).user !== null;
  };

  test('unused for a week, it is over (7.3.1)', async () => {
    expect(await at(IDLE_DAYS * DAY + 1000)).toBe(false);
    expect(rows()).toEqual([]);
  });

  test('used, it goes on', async () => {
    expect(await at(5 * DAY)).toBe(true);
    expect(await at(11 * DAY)).toBe(true);
  });

  test('however busy, it is over after thirty days (7.3.2)', async () => {
    for (let day = 3; day < 30; day += 3) expect(await at(day * DAY)).toBe(true);
    expect(await at(ABSOLUTE_MS - 1000)).toBe(true);
    expect(await at(ABSOLUTE_MS)).toBe(false);
    expect(rows()).toEqual([]);
  });
});

test('signing out ends the session itself, not only the cookie (7.4.1)', async () => {
  await signIn();
  const token = fakeRequest.jar.get(COOKIE) ?? '';
  for (const name of ['combwood_orders', 'combwood_draft']) fakeRequest.jar.set(name, 'x');
  expect((await runAction(signOutAction, {})).to).toBe('/signed-out');
  expect(fakeRequest.jar.has(COOKIE)).toBe(false);
  // What was seen here without an account goes too (14.3.1).
  for (const name of ['combwood_orders', 'combwood_draft']) expect(fakeRequest.jar.has(name)).toBe(false);
  fakeRequest.jar.set(COOKIE, token);
  expect((await getActor()).user).toBeNull();
});

test('signing out everywhere ends the other browsers too (7.4.1, 7.4.3)', async () => {
  await signIn();
  newBrowser('192.0.2.11');
  await signIn();
  expect(rows()).toHaveLength(2);
  await runAction(signOutEverywhereAction, {});
  expect(rows()).toEqual([]);
});

test('a closed account is out at once and cannot come back (7.4.2)', async () => {
  await signIn();
  database.db.update(user).set({ disabledAt: NOW }).run();
  expect((await getActor()).user).toBeNull();
  expect((await signIn()).to).toBeNull();
});

test('people see where they are signed in, and end one of their own only (7.5.2, 8.2.2)', async () => {
  await buildAccount(database.db, 'mei');
  await runAction(signInAction, { email: 'mei@example.test', password: PASSWORD });
  const [foreign] = rows();
  newBrowser('192.0.2.11', 'Mozilla/5.0 (iPhone) Safari/604');
  await signIn();
  newBrowser();
  await signIn();
  const list = await listSessions('usr_noor', Date.now());
  expect(list.map(({ device, here }) => [device, here])).toEqual([
    ['Firefox on Linux', true],
    ['Safari on iPhone', false],
  ]);
  const context = { actor: await getActor(), now: Date.now(), requestId: 'r', address: 'a' };
  expect(endSession({ sessionId: foreign?.id ?? '' }, context)).toMatchObject({ ok: false });
  expect(endSession({ sessionId: list[1]?.id ?? '' }, context)).toMatchObject({ ok: true });
  expect(rows()).toHaveLength(2);
});

test('a role ends with the very next request (8.3.2)', async () => {
  buildCamp(database.db);
  const id = 'usr_noor';
  const held = { organisationId: 'org_1', userId: id, role: 'organiser', createdAt: NOW } as const;
  database.db
    .insert(membership)
    .values({ id: 'mbr_1', ...held })
    .run();
  await signIn();
  expect((await getActor()).roles).toEqual([{ organisationId: 'org_1', role: 'organiser' }]);
  database.db.update(membership).set({ revokedAt: NOW }).where(eq(membership.userId, id)).run();
  expect((await getActor()).roles).toEqual([]);
});
