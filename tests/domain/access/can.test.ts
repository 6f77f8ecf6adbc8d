import { describe, expect, test } from 'vitest';
import { type Actor, VISITOR } from '@/lib/domain/access/actor';
import { can, type Target } from '@/lib/domain/access/can';
import { PERMISSIONS, type Permission } from '@/lib/domain/access/permissions';
import type { StaffRole } from '@/lib/domain/access/roles';
import { EXPECTED } from '../../server/access/expected-access';

// ASVS 5.0, 8.2.1, 8.2.2. The expectation is written by hand from the description of the roles, not from the table.
const user = (tail: string, emailVerified = true): NonNullable<Actor['user']> => ({
  id: `usr_${tail}`,
  name: tail,
  email: `${tail}@example.test`,
  emailVerified,
});
const staff = (role: StaffRole): Actor => ({
  ...VISITOR,
  user: user(role),
  roles: [{ organisationId: 'org_own', role }],
});
const ACTORS: Record<string, Actor> = {
  organiser: staff('organiser'),
  treasurer: staff('treasurer'),
  instructor: staff('instructor'),
  door: staff('door'),
  attendee: { ...VISITOR, user: user('payer') },
  visitor: VISITOR,
};
const own = (permission: Permission): Target => {
  const order = {
    orderId: 'ord_own' as const,
    payerUserId: 'usr_payer' as const,
    payerEmail: 'x@example.test',
  };
  const rule = PERMISSIONS[permission];
  if (!('on' in rule)) return null;
  if (rule.on === 'order') return order;
  if (rule.on === 'registration')
    return { registrationId: 'reg_own', order, attendeeUserId: null, attendeeEmail: 'y@example.test' };
  return { organisationId: 'org_own' };
};
const foreign = (permission: Permission): Target => {
  const order = {
    orderId: 'ord_x' as const,
    payerUserId: 'usr_other' as const,
    payerEmail: 'z@example.test',
  };
  const rule = PERMISSIONS[permission];
  if (!('on' in rule)) return null;
  if (rule.on === 'order') return order;
  if (rule.on === 'registration')
    return { registrationId: 'reg_x', order, attendeeUserId: null, attendeeEmail: 'z@example.test' };
  return { organisationId: 'org_other' };
};

test('the expectation names every permission of the table and no other', () => {
  expect(Object.keys(EXPECTED).sort()).toEqual(Object.keys(PERMISSIONS).sort());
});

describe.each(Object.keys(PERMISSIONS) as Permission[])('%s', (permission) => {
  const expected = EXPECTED[permission];
  test.each(Object.entries(ACTORS))('%s', (who, actor) => {
    const may = expected.may.includes(who as (typeof expected.may)[number]);
    expect(can(actor, permission, own(permission))).toBe(may);
    expect(can(actor, permission, foreign(permission))).toBe(may && !expected.row);
    if (expected.row) expect(can(actor, permission, null)).toBe(false);
  });
});

test('a role in one organisation opens nothing of another (8.4.1)', () => {
  const both: Actor = {
    ...VISITOR,
    user: user('both'),
    roles: [
      { organisationId: 'org_own', role: 'door' },
      { organisationId: 'org_other', role: 'organiser' },
    ],
  };
  expect(can(both, 'camp.edit', { organisationId: 'org_own' })).toBe(false);
  expect(can(both, 'camp.edit', { organisationId: 'org_other' })).toBe(true);
  expect(can(both, 'door.work', { organisationId: 'org_third' as 'org_own' })).toBe(false);
});

describe('an order is one’s own', () => {
  const order = { orderId: 'ord_1' as const, payerUserId: 'usr_a' as const, payerEmail: 'a@example.test' };
  const of = (more: Partial<Actor>): Actor => ({ ...VISITOR, ...more });
  test.each([
    ['by account', of({ user: { ...user('a', false), email: 'old@example.test' } }), true],
    ['by a proven address', of({ user: { ...user('b'), email: 'a@example.test' } }), true],
    [
      'not by an address that is not proven',
      of({ user: { ...user('b', false), email: 'a@example.test' } }),
      false,
    ],
    ['by a link from the mail', of({ orders: ['ord_1'] }), true],
    ['not by a link to another order', of({ orders: ['ord_2'] }), false],
    [
      'not by being staff somewhere',
      of({ user: user('c'), roles: [{ organisationId: 'org_own', role: 'organiser' }] }),
      false,
    ],
  ])('%s', (_, actor, may) => {
    expect(can(actor, 'order.read', order)).toBe(may);
    expect(can(actor, 'order.pay', order)).toBe(may);
  });

  test('whose address is written in capitals', () => {
    const actor = of({ user: { ...user('b'), email: 'a@example.test' } });
    expect(can(actor, 'order.read', { ...order, payerUserId: null, payerEmail: 'A@Example.Test' })).toBe(
      true,
    );
  });
});

describe('an attendee who is not the payer', () => {
  const order = { orderId: 'ord_1' as const, payerUserId: null, payerEmail: 'parent@example.test' };
  const registration = {
    registrationId: 'reg_1' as const,
    order,
    attendeeUserId: null,
    attendeeEmail: 'kid@example.test',
  };
  const kid: Actor = { ...VISITOR, user: { ...user('kid') } };

  test('sees their own registration', () => expect(can(kid, 'registration.read', registration)).toBe(true));
  test('sees nothing of the order', () => {
    expect(can(kid, 'order.read', order)).toBe(false);
    expect(can(kid, 'order.pay', order)).toBe(false);
    expect(can(kid, 'order.read', registration)).toBe(false);
  });
  test('sees it by the link in their own mail too, and still nothing of the order', () => {
    const holder: Actor = { ...VISITOR, registrations: ['reg_1'] };
    expect(can(holder, 'registration.read', registration)).toBe(true);
    expect(can(holder, 'order.read', order)).toBe(false);
    expect(can(holder, 'registration.read', { ...registration, registrationId: 'reg_2' })).toBe(false);
  });
  test('sees no other of the same order', () =>
    expect(can(kid, 'registration.read', { ...registration, attendeeEmail: 'sister@example.test' })).toBe(
      false,
    ));
  test('sees nothing before the address is proven', () =>
    expect(can({ ...kid, user: { ...user('kid', false) } }, 'registration.read', registration)).toBe(false));
});

test('the payment provider’s permission is nobody’s', () => {
  for (const actor of Object.values(ACTORS)) expect(can(actor, 'payment.notify')).toBe(false);
});
