import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, test, vi } from 'vitest';
import { resendVerificationAction, signUpAction } from '@/app/(account)/sign-up/actions';
import { verifyAction } from '@/app/(account)/verify/actions';
import VerifyPage from '@/app/(account)/verify/page';
import { emailToken, session, user } from '@/db/schema/account';
import { mail } from '@/db/schema/mail';
import { getActor } from '@/lib/server/auth/get-actor';
import { hashToken } from '@/lib/server/hash-token';
import { buildAccount, PASSWORD } from '../../builders/build-account';
import { lastToken, lettersOf } from '../../setup/account-letters';
import { fakeRequest, newBrowser, settled, useFakeRequest } from '../../setup/fake-request';
import { runAction } from '../../setup/run-action';
import { useTestDatabase } from '../../setup/test-database';

vi.mock('next/headers', async () => (await import('../../setup/fake-request')).nextHeaders);
vi.mock('next/server', async () => (await import('../../setup/fake-request')).nextServer);

const database = useTestDatabase();
useFakeRequest();
const FORM = { name: 'Sam Okoro', email: 'Sam@Example.test ', password: PASSWORD };
const signUp = (more: Partial<typeof FORM> & Record<string, string> = {}) =>
  runAction(signUpAction, { ...FORM, ...more });
const sam = () => database.db.select().from(user).where(eq(user.email, 'sam@example.test')).get();
const DAY = 24 * 60 * 60 * 1000;

test('a new account waits for its proof; the letter has the token, the table its hash (6.5.2)', async () => {
  expect((await signUp()).to).toBe('/sign-up/sent');
  await settled();
  expect(sam()).toMatchObject({ name: 'Sam Okoro', emailVerifiedAt: null });
  expect(sam()?.passwordHash).toMatch(/^\$argon2id\$/);
  const token = lastToken(database.db, 'verify');
  expect(database.db.select().from(emailToken).all()).toMatchObject([
    { tokenHash: hashToken(token), usedAt: null },
  ]);
  expect((await getActor()).user).toBeNull();
});

test('a known address gets the same answer, and a letter of another kind (6.3.8)', async () => {
  const fresh = await signUp();
  const cookieOf = () => fakeRequest.written.map(({ name, value, flags }) => [name, value.length, flags]);
  const freshCookies = cookieOf();
  await settled();
  newBrowser();
  const known = await signUp({ name: 'Someone Else', password: 'another walnut reed' });
  expect(known).toEqual(fresh);
  expect(cookieOf()).toEqual(freshCookies);
  // Nothing is looked up before the answer has left.
  expect(lettersOf(database.db)).toHaveLength(1);
  await settled();
  expect(lettersOf(database.db).map(({ kind, to }) => [kind, to])).toEqual([
    ['verify', 'sam@example.test'],
    ['known-address', 'sam@example.test'],
  ]);
  expect(sam()?.name).toBe('Sam Okoro');
});

test('two who open the same account at once make one', async () => {
  await Promise.all([signUp(), signUp(), signUp()]);
  await settled();
  expect(database.db.select().from(user).all()).toHaveLength(1);
  expect(lettersOf(database.db).filter(({ kind }) => kind === 'verify')).toHaveLength(1);
});

test.each([
  [{ password: 'short' }, 'password', /5 characters/],
  [{ password: 'password1' }, 'password', /guessed first/],
  [{ password: 'Sam Okoro1' }, 'password', /own name|guessed first/],
  [{ password: '' }, 'password', /empty/],
  [{ name: '' }, 'name', /empty/],
  [{ name: 'Sam\r\nBcc: all@example.test' }, 'name', /line break/],
  [{ email: 'sam' }, 'email', /not complete/],
])('%j is refused at its field and the rest is kept', async (more, field, said) => {
  const outcome = await signUp(more as Partial<typeof FORM>);
  expect(outcome.to).toBeNull();
  expect(outcome.fields[field]?.join(' ')).toMatch(said);
  expect(outcome.state?.initialValue).not.toHaveProperty('password');
  await settled();
  expect(lettersOf(database.db)).toEqual([]);
});

test('extra fields make nobody staff or proven (15.3.3)', async () => {
  await signUp({ emailVerifiedAt: '1', role: 'organiser', id: 'usr_evil', disabledAt: '' });
  await settled();
  expect(sam()).toMatchObject({ emailVerifiedAt: null, disabledAt: null });
  expect(sam()?.id).not.toBe('usr_evil');
});

test('one mailbox gets five letters an hour at most, whatever strangers ask for (2.4.1)', async () => {
  for (let n = 0; n < 9; n += 1) {
    newBrowser(`198.51.100.${n}`);
    expect((await signUp()).to).toBe('/sign-up/sent');
    await settled();
  }
  expect(lettersOf(database.db)).toHaveLength(5);
});

describe('the link', () => {
  let token = '';
  beforeEach(async () => {
    await signUp({ next: '/invitations/abc' });
    await settled();
    token = lastToken(database.db, 'verify');
  });
  const press = (more: Record<string, string> = {}) => runAction(verifyAction, { token, ...more });

  test('opening it changes nothing; pressing the button does (3.5.3)', async () => {
    const before = database.db.select().from(emailToken).all();
    await VerifyPage({ searchParams: Promise.resolve({ token }) });
    expect(database.db.select().from(emailToken).all()).toEqual(before);
    expect(sam()?.emailVerifiedAt).toBeNull();
    expect((await press()).to).toBe('/invitations/abc');
    expect(sam()?.emailVerifiedAt).toBeTypeOf('number');
    expect((await getActor()).user).toMatchObject({ email: 'sam@example.test', emailVerified: true });
  });

  test('works once (6.4.1)', async () => {
    await press();
    newBrowser();
    expect((await press({ password: PASSWORD })).sentence).toMatch(/used already/);
  });

  test('of many pressed at once one works (6.5.1)', async () => {
    const all = await Promise.all(Array.from({ length: 8 }, () => press()));
    expect(all.filter(({ to }) => to !== null)).toHaveLength(1);
  });

  test('works for a day (6.5.5)', async () => {
    vi.useFakeTimers({ toFake: ['Date'], now: Date.now() + DAY + 1000 });
    expect((await press()).sentence).toMatch(/too old/);
    vi.useRealTimers();
  });

  test('on another device it asks for the password: nobody proves an address for a stranger’s account', async () => {
    newBrowser('203.0.113.9');
    expect((await press()).fields.password?.join()).toMatch(/not the one/);
    expect((await press({ password: 'wrong walnut reed' })).fields.password?.join()).toMatch(/not the one/);
    expect(sam()?.emailVerifiedAt).toBeNull();
    expect((await press({ password: PASSWORD })).to).toBe('/my');
  });

  test('the cookie of a sign-up with a known address proves nothing', async () => {
    newBrowser('203.0.113.9');
    await signUp({ password: 'another walnut reed' });
    await settled();
    expect((await press()).fields.password?.join()).toMatch(/not the one/);
  });

  test.each(['', 'x', `${'a'.repeat(27)}`, "' or 1=1 --"])(
    'a made-up token %j opens nothing',
    async (made) => {
      expect((await runAction(verifyAction, { token: made })).to).toBeNull();
      expect(sam()?.emailVerifiedAt).toBeNull();
    },
  );

  test('can be sent again, by who opened the account only', async () => {
    await runAction(resendVerificationAction, {});
    await settled();
    expect(lettersOf(database.db)).toHaveLength(2);
    newBrowser();
    expect((await runAction(resendVerificationAction, {})).sentence).toMatch(/Sign in/);
    await settled();
    expect(lettersOf(database.db)).toHaveLength(2);
  });
});

test('a link is void once the account has another address', async () => {
  await buildAccount(database.db, 'noor', { emailVerifiedAt: null });
  await signUp();
  await settled();
  const token = lastToken(database.db, 'verify');
  database.db.update(user).set({ email: 'new@example.test' }).where(eq(user.email, 'sam@example.test')).run();
  expect((await runAction(verifyAction, { token })).sentence).toMatch(/used already/);
});

test('markup in a name stays text (1.2.1)', async () => {
  await signUp({ name: '<img src=x onerror=alert(1)>' });
  await settled();
  expect(sam()?.name).toBe('<img src=x onerror=alert(1)>');
  expect(database.db.select().from(mail).get()?.toName).toBe('<img src=x onerror=alert(1)>');
  expect(database.db.select().from(session).all()).toEqual([]);
});
