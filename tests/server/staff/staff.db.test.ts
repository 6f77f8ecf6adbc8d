import { beforeEach, describe, expect, test, vi } from 'vitest';
import { acceptInvitationAction } from '@/app/(account)/invitations/[token]/actions';
import InvitationPage from '@/app/(account)/invitations/[token]/page';
import { signInAction } from '@/app/(account)/sign-in/actions';
import {
  inviteStaffAction,
  resendInvitationAction,
  revokeInvitationAction,
  revokeRoleAction,
} from '@/app/(organiser)/organise/organisations/[organisationId]/staff/actions';
import { user } from '@/db/schema/account';
import { audit } from '@/db/schema/audit';
import { mail } from '@/db/schema/mail';
import { invitation, membership } from '@/db/schema/organisation';
import type { StaffRole } from '@/lib/domain/access/roles';
import type { OrganisationId, UserId } from '@/lib/domain/shared/ids';
import { getActor } from '@/lib/server/auth/get-actor';
import { hashToken } from '@/lib/server/hash-token';
import { revokeRole } from '@/lib/server/staff/revoke-role';
import { buildAccount, PASSWORD } from '../../builders/build-account';
import { buildCamp, NOW } from '../../builders/build-camp';
import { lastToken, lettersOf } from '../../setup/account-letters';
import { newBrowser, useFakeRequest } from '../../setup/fake-request';
import { runAction } from '../../setup/run-action';
import { useTestDatabase } from '../../setup/test-database';

vi.mock('next/headers', async () => (await import('../../setup/fake-request')).nextHeaders);
vi.mock('next/cache', async () => (await import('../../setup/fake-request')).nextCache);

const database = useTestDatabase();
useFakeRequest();
const WEEK = 7 * 24 * 60 * 60 * 1000;

const give = (userId: UserId, role: StaffRole, organisationId: OrganisationId = 'org_1') =>
  database.db
    .insert(membership)
    .values({ id: `mbr_${userId.slice(4)}${role}`, organisationId, userId, role, createdAt: NOW })
    .run();
const as = async (tail: string) => {
  newBrowser();
  expect(
    (await runAction(signInAction, { email: `${tail}@example.test`, password: PASSWORD })).to,
  ).not.toBeNull();
};
const invite = (email: string, role = 'door', organisationId = 'org_1') =>
  runAction(inviteStaffAction, { organisationId, email, role });
const accept = (token: string) => runAction(acceptInvitationAction, { token });
const roles = (userId: UserId) =>
  database.db
    .select()
    .from(membership)
    .all()
    .filter((row) => row.userId === userId && row.revokedAt === null)
    .map((row) => row.role);

beforeEach(async () => {
  buildCamp(database.db);
  buildCamp(database.db, { id: 'cmp_2', organisationId: 'org_2' });
  await buildAccount(database.db, 'ana');
  await buildAccount(database.db, 'mei');
  give('usr_ana', 'organiser');
  await as('ana');
  return () => vi.useRealTimers();
});

describe('an invitation', () => {
  test('goes by mail with its words; the table holds the hash only (6.5.2)', async () => {
    expect((await invite(' Mei@Example.test ')).state?.status).toBe('success');
    const row = database.db.select().from(mail).get();
    expect(row).toMatchObject({ kind: 'invite', toEmail: 'mei@example.test' });
    expect(row?.payload).toMatchObject({
      organisationName: 'Slate Ridge Harp Society',
      role: 'door',
      invitedBy: 'Noor Haddad',
    });
    const token = lastToken(database.db, 'invite');
    expect(database.db.select().from(invitation).get()?.tokenHash).toBe(hashToken(token));
    expect(
      database.db
        .select()
        .from(audit)
        .all()
        .map(({ action }) => action),
    ).toEqual(['staff.invite']);
  });

  test('is accepted by the proven address it was sent to, and works at the next request', async () => {
    await invite('mei@example.test');
    const token = lastToken(database.db, 'invite');
    await as('mei');
    expect((await getActor()).roles).toEqual([]);
    await InvitationPage({ params: Promise.resolve({ token }), searchParams: Promise.resolve({}) });
    expect((await getActor()).roles).toEqual([]);
    expect((await accept(token)).to).toBe('/door');
    expect((await getActor()).roles).toEqual([{ organisationId: 'org_1', role: 'door' }]);
    expect(
      database.db
        .select()
        .from(audit)
        .all()
        .map(({ action }) => action),
    ).toContain('staff.accept');
  });

  test('is no use to anybody else who holds the link, nor before the address is proven', async () => {
    await invite('mei@example.test');
    const token = lastToken(database.db, 'invite');
    await buildAccount(database.db, 'eve');
    await as('eve');
    expect((await accept(token)).sentence).toMatch(/is for mei@example\.test/);
    database.db.update(user).set({ emailVerifiedAt: null }).run();
    await as('mei');
    expect((await accept(token)).sentence).toMatch(/confirmed address/);
    newBrowser();
    expect((await accept(token)).sentence).toMatch(/Sign in/);
    expect([roles('usr_eve'), roles('usr_mei')]).toEqual([[], []]);
  });

  test('works once, raced (6.4.1, 6.5.1)', async () => {
    await invite('mei@example.test');
    const token = lastToken(database.db, 'invite');
    await as('mei');
    const all = await Promise.all(Array.from({ length: 6 }, () => accept(token)));
    expect(all.filter(({ to }) => to !== null)).toHaveLength(1);
    expect(roles('usr_mei')).toEqual(['door']);
  });

  test('works for a week, and not after it was taken back or sent anew (6.5.5)', async () => {
    await invite('mei@example.test');
    const first = lastToken(database.db, 'invite');
    const id = database.db.select().from(invitation).get()?.id ?? '';
    await runAction(resendInvitationAction, { organisationId: 'org_1', invitationId: id });
    const second = lastToken(database.db, 'invite');
    expect(second).not.toBe(first);
    await as('mei');
    expect((await accept(first)).to).toBeNull();
    vi.useFakeTimers({ toFake: ['Date'], now: Date.now() + WEEK + 1000 });
    // The sign-in is a week old by then, too.
    await as('mei');
    expect((await accept(second)).sentence).toMatch(/too old/);
    vi.useRealTimers();
    await as('ana');
    await runAction(revokeInvitationAction, { organisationId: 'org_1', invitationId: id });
    await as('mei');
    expect((await accept(second)).sentence).toMatch(/taken back/);
  });

  test('sent twice, only the newer link works', async () => {
    await invite('mei@example.test');
    const first = lastToken(database.db, 'invite');
    await invite('mei@example.test');
    await as('mei');
    expect((await accept(first)).to).toBeNull();
    expect((await accept(lastToken(database.db, 'invite'))).to).toBe('/door');
  });

  test('to a role that is held already is pointed out', async () => {
    give('usr_mei', 'door');
    expect((await invite('mei@example.test')).fields.email?.join()).toMatch(/door crew already/);
  });

  test.each([
    [{ email: 'x', role: 'door' }, 'email'],
    [{ email: 'a@b.test\nBcc: c@d.test', role: 'door' }, 'email'],
    [{ email: 'a@b.test', role: 'owner' }, 'role'],
    [{ email: 'a@b.test' }, 'role'],
  ])('%j is refused at its field', async (given, field) => {
    const outcome = await runAction(inviteStaffAction, { organisationId: 'org_1', ...given } as Record<
      string,
      string
    >);
    expect(Object.keys(outcome.fields)).toEqual([field]);
    expect(lettersOf(database.db)).toEqual([]);
  });

  test('cannot be used to flood a mailbox (2.4.1)', async () => {
    for (let n = 0; n < 7; n += 1) await invite('mei@example.test');
    expect(lettersOf(database.db)).toHaveLength(5);
  });
});

describe('who may', () => {
  test.each(['treasurer', 'instructor', 'door'] as const)('not the %s', async (role) => {
    give('usr_mei', role);
    await as('mei');
    expect((await invite('eve@example.test')).sentence).toMatch(/role does not cover/);
    const outcome = await runAction(revokeRoleAction, {
      organisationId: 'org_1',
      membershipId: 'mbr_anaorganiser',
    });
    expect(outcome.sentence).toMatch(/role does not cover/);
    expect(roles('usr_ana')).toEqual(['organiser']);
  });

  test('not the organiser of another organisation (8.2.2, 8.4.1)', async () => {
    give('usr_mei', 'organiser', 'org_2');
    await invite('eve@example.test');
    const id = database.db.select().from(invitation).get()?.id ?? '';
    await as('mei');
    expect((await invite('eve@example.test')).sentence).toMatch(/nothing here/);
    // Their own organisation named, the row another's: the owner is in the query too.
    for (const organisationId of ['org_1', 'org_2']) {
      const taken = await runAction(revokeRoleAction, { organisationId, membershipId: 'mbr_anaorganiser' });
      expect(taken.sentence).toMatch(/nothing here/);
      const back = await runAction(revokeInvitationAction, { organisationId, invitationId: id });
      expect(back.sentence).toMatch(/nothing here/);
      const again = await runAction(resendInvitationAction, { organisationId, invitationId: id });
      expect(again.sentence).toMatch(/nothing here/);
    }
    expect(roles('usr_ana')).toEqual(['organiser']);
    expect(database.db.select().from(invitation).get()?.revokedAt).toBeNull();
  });
});

describe('a role that is taken away', () => {
  test('ends with the next request of its holder, and is kept as history (8.3.2)', async () => {
    give('usr_mei', 'organiser');
    await runAction(revokeRoleAction, { organisationId: 'org_1', membershipId: 'mbr_meiorganiser' });
    await as('mei');
    expect((await invite('eve@example.test')).sentence).toMatch(/nothing here/);
    expect(database.db.select().from(membership).all()).toHaveLength(2);
    expect(
      database.db
        .select()
        .from(audit)
        .all()
        .map(({ action }) => action),
    ).toEqual(['staff.revoke']);
  });

  test('is never the last organiser’s', async () => {
    const outcome = await runAction(revokeRoleAction, {
      organisationId: 'org_1',
      membershipId: 'mbr_anaorganiser',
    });
    expect(outcome.sentence).toMatch(/last organiser/);
    expect(roles('usr_ana')).toEqual(['organiser']);
  });

  test('an organiser whose account is closed does not count', async () => {
    await buildAccount(database.db, 'old', { disabledAt: NOW });
    give('usr_old', 'organiser');
    const outcome = await runAction(revokeRoleAction, {
      organisationId: 'org_1',
      membershipId: 'mbr_anaorganiser',
    });
    expect(outcome.sentence).toMatch(/last organiser/);
  });

  test('two organisers who take each other’s away: one stays', () => {
    give('usr_mei', 'organiser');
    const by = (tail: string) => ({
      actor: {
        user: { id: `usr_${tail}` as UserId, name: tail, email: `${tail}@example.test`, emailVerified: true },
        roles: [{ organisationId: 'org_1' as const, role: 'organiser' as const }],
        orders: [],
        registrations: [],
      },
      now: NOW,
    });
    const done = [
      revokeRole({ organisationId: 'org_1', membershipId: 'mbr_meiorganiser' }, by('ana')),
      revokeRole({ organisationId: 'org_1', membershipId: 'mbr_anaorganiser' }, by('mei')),
    ];
    expect(done.map(({ ok }) => ok)).toEqual([true, false]);
  });

  test('one’s own leads away from the page', async () => {
    give('usr_mei', 'organiser');
    const outcome = await runAction(revokeRoleAction, {
      organisationId: 'org_1',
      membershipId: 'mbr_anaorganiser',
    });
    expect(outcome.to).toBe('/organise');
  });
});
