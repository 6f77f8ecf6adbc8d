import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, test } from 'vitest';
import { user } from '@/db/schema/account';
import { membership } from '@/db/schema/organisation';
import { type Actor, VISITOR } from '@/lib/domain/access/actor';
import { PERMISSIONS, type Permission, type PermissionRule } from '@/lib/domain/access/permissions';
import { STAFF_ROLES } from '@/lib/domain/access/roles';
import type { UserId } from '@/lib/domain/shared/ids';
import { refusalFor } from '@/lib/server/access/authorise';
import type { TargetKind } from '@/lib/server/access/find-target';
import { listRoles } from '@/lib/server/auth/list-roles';
import { buildCamp, NOW } from '../../builders/build-camp';
import { buildOrder } from '../../builders/build-order';
import { buildUser } from '../../builders/build-user';
import { useTestDatabase } from '../../setup/test-database';
import { EXPECTED } from './expected-access';

// ASVS 5.0, 8.2.1, 8.2.2, 8.3.2, 8.4.1, on real rows: every permission × who asks × own, foreign and missing row.
const database = useTestDatabase();
const OWN: Record<TargetKind, string> = {
  organisation: 'org_1',
  camp: 'cmp_1',
  order: 'ord_1',
  registration: 'reg_1a',
};
const FOREIGN: Record<TargetKind, string> = {
  organisation: 'org_2',
  camp: 'cmp_2',
  order: 'ord_2',
  registration: 'reg_2a',
};
const MISSING: Record<TargetKind, string[]> = {
  organisation: ['org_none', '', "org_1' or '1'='1", 'cmp_1'],
  camp: ['cmp_none', '', 'org_1', 'cmp_1 '],
  order: ['ord_none', '', 'reg_1a', 'ord_%'],
  registration: ['reg_none', '', 'ord_1', '../reg_1a'],
};

const actorOf = (id: UserId): Actor => {
  const row = database.db.select().from(user).where(eq(user.id, id)).get();
  if (!row) throw new Error(id);
  const { name, email, emailVerifiedAt } = row;
  return {
    ...VISITOR,
    user: { id, name, email, emailVerified: emailVerifiedAt !== null },
    roles: listRoles(id),
  };
};

beforeEach(() => {
  buildCamp(database.db);
  buildCamp(database.db, { id: 'cmp_2', organisationId: 'org_2' });
  for (const role of STAFF_ROLES) buildUser(database.db, { id: `usr_${role}`, in: 'org_1', roles: [role] });
  buildUser(database.db, { id: 'usr_attendee', email: 'payer@example.test' });
  buildUser(database.db, { id: 'usr_stranger', email: 'other@example.test' });
  buildOrder(database.db, { payer: { payerEmail: 'payer@example.test' } });
  buildOrder(database.db, {
    id: 'ord_2',
    organisationId: 'org_2',
    campId: 'cmp_2',
    payer: { payerEmail: 'other@example.test' },
  });
});

const WHO = [...STAFF_ROLES, 'attendee', 'visitor'] as const;

describe.each(Object.keys(PERMISSIONS) as Permission[])('%s', (permission) => {
  const rule: PermissionRule = PERMISSIONS[permission];
  const kind = 'on' in rule ? rule.on : null;
  const { may, row } = EXPECTED[permission];
  const asker = (who: (typeof WHO)[number]) => (id?: string) =>
    refusalFor(
      who === 'visitor' ? VISITOR : actorOf(`usr_${who}`),
      permission,
      kind && id !== undefined ? { kind, id } : undefined,
    )?.code ?? 'may';
  // Who is not signed in is asked to, where signing in could help.
  const helps = rule.who === 'staff' || rule.who === 'signed-in';

  test('on a row of one’s own', () => {
    const said = Object.fromEntries(WHO.map((who) => [who, asker(who)(kind ? OWN[kind] : undefined)]));
    const expected = Object.fromEntries(
      WHO.map((who) => {
        if (may.includes(who)) return [who, 'may'];
        if (who === 'visitor' && helps) return [who, 'sign_in_first'];
        return [
          who,
          rule.who === 'staff' && who !== 'attendee' && who !== 'visitor' ? 'not_allowed' : 'not_found',
        ];
      }),
    );
    // The webhook's signature is its proof, so the ladder never asks this table about it.
    if (rule.who === 'provider') expect(Object.values(said)).not.toContain('may');
    else expect(said).toEqual(expected);
  });

  test.runIf(kind !== null && row)('on a foreign row it is as if the row were not there', () => {
    if (!kind) return;
    for (const who of WHO) {
      const code = who === 'visitor' && helps ? 'sign_in_first' : 'not_found';
      const ids = [FOREIGN[kind], ...MISSING[kind], undefined];
      expect([who, ...ids.map((id) => asker(who)(id))]).toEqual([who, ...ids.map(() => code)]);
    }
  });
});

test('a revoked role refuses at the next question (8.3.2)', () => {
  expect(refusalFor(actorOf('usr_organiser'), 'camp.edit', { kind: 'camp', id: 'cmp_1' })).toBeNull();
  database.db.update(membership).set({ revokedAt: NOW }).where(eq(membership.userId, 'usr_organiser')).run();
  expect(refusalFor(actorOf('usr_organiser'), 'camp.edit', { kind: 'camp', id: 'cmp_1' })?.code).toBe(
    'not_found',
  );
});

test('an attendee reads their own registration by a proven address, and nothing of the money', () => {
  const kid = actorOf(buildUser(database.db, { id: 'usr_kid', email: 'a@example.test' }));
  expect(refusalFor(kid, 'registration.read', { kind: 'registration', id: 'reg_1a' })).toBeNull();
  expect(refusalFor(kid, 'order.read', { kind: 'order', id: 'ord_1' })?.code).toBe('not_found');
  const unproven: Actor = { ...kid, user: kid.user && { ...kid.user, emailVerified: false } };
  expect(refusalFor(unproven, 'registration.read', { kind: 'registration', id: 'reg_1a' })?.code).toBe(
    'not_found',
  );
});

test('a mailed link opens its order and the registrations of it, no other', () => {
  const holder: Actor = { ...VISITOR, orders: ['ord_1'] };
  expect(refusalFor(holder, 'order.read', { kind: 'order', id: 'ord_1' })).toBeNull();
  expect(refusalFor(holder, 'registration.read', { kind: 'registration', id: 'reg_1a' })).toBeNull();
  expect(refusalFor(holder, 'order.read', { kind: 'order', id: 'ord_2' })?.code).toBe('not_found');
  expect(refusalFor(holder, 'registration.read', { kind: 'registration', id: 'reg_2a' })?.code).toBe(
    'not_found',
  );
});
