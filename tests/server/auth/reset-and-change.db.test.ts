import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, test, vi } from 'vitest';
import { changeAddressAction, changeNameAction, changePasswordAction } from '@/app/(account)/account/actions';
import { askResetAction, resetAction } from '@/app/(account)/reset/actions';
import ResetPage from '@/app/(account)/reset/page';
import { signInAction } from '@/app/(account)/sign-in/actions';
import { verifyAction } from '@/app/(account)/verify/actions';
import { emailToken, session, user } from '@/db/schema/account';
import { getActor } from '@/lib/server/auth/get-actor';
import { buildAccount, PASSWORD } from '../../builders/build-account';
import { lastToken, lettersOf } from '../../setup/account-letters';
import { fakeRequest, newBrowser, settled, useFakeRequest } from '../../setup/fake-request';
import { runAction } from '../../setup/run-action';
import { useTestDatabase } from '../../setup/test-database';

vi.mock('next/headers', async () => (await import('../../setup/fake-request')).nextHeaders);
vi.mock('next/server', async () => (await import('../../setup/fake-request')).nextServer);
vi.mock('next/cache', async () => (await import('../../setup/fake-request')).nextCache);

const database = useTestDatabase();
useFakeRequest();
const EMAIL = 'noor@example.test';
const NEW = 'another walnut reed';
const signIn = (password = PASSWORD, email = EMAIL) => runAction(signInAction, { email, password });
const sessions = () => database.db.select().from(session).all();
const noor = () => database.db.select().from(user).where(eq(user.id, 'usr_noor')).get();

beforeEach(async () => {
  await buildAccount(database.db);
  return () => vi.useRealTimers();
});

const ask = async (email = EMAIL) => {
  const outcome = await runAction(askResetAction, { email });
  await settled();
  return outcome;
};

describe('a forgotten password', () => {
  test('known and unknown addresses get the same answer; one gets a letter (6.3.8)', async () => {
    const known = await ask();
    const unknown = await ask('nobody@example.test');
    const said = ({ state, ...rest }: typeof known) => ({ ...rest, status: state?.status });
    expect(said(unknown)).toEqual(said(known));
    expect(lettersOf(database.db).map(({ kind, to }) => [kind, to])).toEqual([['reset', EMAIL]]);
  });

  test('sets a new one, ends every session and voids the other links (7.4.3)', async () => {
    await signIn();
    newBrowser('192.0.2.11');
    await signIn();
    await ask();
    const older = lastToken(database.db, 'reset');
    await ask();
    const token = lastToken(database.db, 'reset');
    newBrowser('192.0.2.12');
    expect((await runAction(resetAction, { token, password: NEW })).to).toBe('/my');
    expect(sessions()).toHaveLength(1);
    expect((await runAction(resetAction, { token: older, password: PASSWORD })).sentence).toMatch(
      /used already/,
    );
    newBrowser();
    expect((await signIn()).to).toBeNull();
    expect((await signIn(NEW)).to).toBe('/my');
    expect(lettersOf(database.db).at(-1)).toMatchObject({ kind: 'account-changed', to: EMAIL });
  });

  test('opening the link changes nothing (3.5.3)', async () => {
    await ask();
    const before = database.db.select().from(emailToken).all();
    await ResetPage({ searchParams: Promise.resolve({ token: lastToken(database.db, 'reset') }) });
    expect(database.db.select().from(emailToken).all()).toEqual(before);
  });

  test('the link works once, raced (6.5.1)', async () => {
    await ask();
    const token = lastToken(database.db, 'reset');
    const all = await Promise.all(
      Array.from({ length: 5 }, (_, n) => runAction(resetAction, { token, password: `${NEW} ${n}` })),
    );
    expect(all.filter(({ to }) => to !== null)).toHaveLength(1);
  });

  test('the link works for an hour (6.5.5)', async () => {
    await ask();
    const token = lastToken(database.db, 'reset');
    vi.useFakeTimers({ toFake: ['Date'], now: Date.now() + 60 * 60 * 1000 + 1000 });
    expect((await runAction(resetAction, { token, password: NEW })).sentence).toMatch(/older than an hour/);
  });

  test('a weak one is refused and the link still works', async () => {
    await ask();
    const token = lastToken(database.db, 'reset');
    expect((await runAction(resetAction, { token, password: 'password1' })).fields.password).toBeDefined();
    expect((await runAction(resetAction, { token, password: NEW })).to).toBe('/my');
  });

  test('a proof link sets no password, and a reset link proves nothing by itself', async () => {
    await ask();
    const token = lastToken(database.db, 'reset');
    expect((await runAction(verifyAction, { token, password: PASSWORD })).to).toBeNull();
    expect(noor()?.passwordHash).toBeDefined();
    database.db.update(emailToken).set({ kind: 'verify' }).run();
    expect((await runAction(resetAction, { token, password: NEW })).sentence).toMatch(/used already/);
  });

  test('strangers who ask all day send five working links an hour, and lock nobody out', async () => {
    for (let n = 0; n < 8; n += 1) await ask();
    expect(lettersOf(database.db)).toHaveLength(5);
    const token = lettersOf(database.db)[0]?.token ?? '';
    expect((await runAction(resetAction, { token, password: NEW })).to).toBe('/my');
  });

  test('a closed account gets no letter', async () => {
    database.db.update(user).set({ disabledAt: 1 }).run();
    await ask();
    expect(lettersOf(database.db)).toEqual([]);
  });
});

describe('a new password of one’s own', () => {
  const change = (current: string, password: string) =>
    runAction(changePasswordAction, { current, password });

  test('asks for the present one, ends the others and gives this browser a new session (7.4.3, 7.5.1)', async () => {
    newBrowser('192.0.2.11');
    await signIn();
    newBrowser();
    await signIn();
    const before = fakeRequest.jar.get('combwood_session');
    expect((await change('wrong walnut', NEW)).fields.current?.join()).toMatch(/not the one/);
    expect(sessions()).toHaveLength(2);
    expect((await change(PASSWORD, NEW)).state?.status).toBe('success');
    expect(sessions()).toHaveLength(1);
    expect(fakeRequest.jar.get('combwood_session')).not.toBe(before);
    expect((await getActor()).user?.email).toBe(EMAIL);
  });

  test('is refused to who is not signed in', async () => {
    expect((await change(PASSWORD, NEW)).sentence).toMatch(/Sign in/);
  });

  test('guesses of the present one are counted like sign-ins', async () => {
    await signIn();
    fakeRequest.jar.delete('combwood_device');
    for (let n = 0; n < 8; n += 1) await change(`wrong ${n}`, NEW);
    expect((await change(PASSWORD, NEW)).sentence).toMatch(/lot of tries/);
  });
});

describe('a new address of one’s own', () => {
  const move = async (email: string, current = PASSWORD) => {
    const outcome = await runAction(changeAddressAction, { email, current });
    await settled();
    return outcome;
  };
  beforeEach(async () => {
    await signIn();
  });

  test('asks for the password, then for proof of the new one, then tells the old one (7.5.1)', async () => {
    expect((await move('new@example.test', 'wrong walnut')).fields.current).toBeDefined();
    expect(lettersOf(database.db)).toEqual([]);
    expect((await move('new@example.test')).state?.status).toBe('success');
    expect(noor()?.email).toBe(EMAIL);
    const token = lastToken(database.db, 'verify');
    expect((await runAction(verifyAction, { token })).to).toBe('/account');
    expect(noor()?.email).toBe('new@example.test');
    expect(lettersOf(database.db).map(({ kind, to }) => [kind, to])).toEqual([
      ['verify', 'new@example.test'],
      ['account-changed', EMAIL],
    ]);
    expect((await getActor()).user?.email).toBe('new@example.test');
    expect(sessions()).toHaveLength(1);
  });

  test('who has the new mailbox only cannot take the account', async () => {
    await move('new@example.test');
    newBrowser('203.0.113.4');
    expect((await runAction(verifyAction, { token: lastToken(database.db, 'verify') })).to).toBeNull();
    expect(noor()?.email).toBe(EMAIL);
  });

  test('somebody else’s address: the same answer, and they are told (6.3.8)', async () => {
    await buildAccount(database.db, 'mei');
    const free = await move('new@example.test');
    const taken = await move('mei@example.test');
    expect(taken.state?.status).toBe(free.state?.status);
    expect(lettersOf(database.db).map(({ kind, to }) => [kind, to])).toEqual([
      ['verify', 'new@example.test'],
      ['known-address', 'mei@example.test'],
    ]);
  });

  test('an address that was taken in the meantime is not taken twice', async () => {
    await move('mei@example.test');
    await buildAccount(database.db, 'mei');
    expect((await runAction(verifyAction, { token: lastToken(database.db, 'verify') })).to).toBeNull();
    expect(noor()?.email).toBe(EMAIL);
  });

  test('the same address again is pointed out', async () => {
    expect((await move(EMAIL)).fields.email?.join()).toMatch(/already/);
  });

  test('a name is one’s own to change', async () => {
    await buildAccount(database.db, 'mei');
    await runAction(changeNameAction, { name: ' Noor  H. ', id: 'usr_mei', userId: 'usr_mei' });
    expect(noor()?.name).toBe('Noor  H.');
    expect(database.db.select().from(user).where(eq(user.id, 'usr_mei')).get()?.name).toBe('Noor Haddad');
  });
});
