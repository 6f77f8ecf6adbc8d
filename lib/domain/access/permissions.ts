import type { StaffRole } from './roles';

/**
 * The one permission table. `on` is the kind of row that is touched; a staff permission holds when the person has one
 * of `roles` in the organisation that owns the row. `anyone` needs no sign-in, `signed-in` any account, `own` the
 * order's payer (by account, proven address, or a link from their own mail). On a registration, `own` is its attendee too:
 * their ticket and packing list, never the order's money.
 */
export const PERMISSIONS = {
  'public.read': { who: 'anyone' },
  'registration.draft': { who: 'anyone' },
  'registration.submit': { who: 'anyone' },
  'account.open': { who: 'anyone' },
  'account.own': { who: 'signed-in' },
  'invitation.accept': { who: 'signed-in' },
  'organisation.create': { who: 'signed-in' },
  'order.read': { who: 'own', on: 'order' },
  'order.pay': { who: 'own', on: 'order' },
  'registration.read': { who: 'own', on: 'registration' },
  'payment.notify': { who: 'provider' },
  'organisation.read': {
    who: 'staff',
    on: 'organisation',
    roles: ['organiser', 'treasurer', 'instructor', 'door'],
  },
  'organisation.edit': { who: 'staff', on: 'organisation', roles: ['organiser'] },
  'staff.manage': { who: 'staff', on: 'organisation', roles: ['organiser'] },
  'camp.create': { who: 'staff', on: 'organisation', roles: ['organiser'] },
  'camp.read': { who: 'staff', on: 'camp', roles: ['organiser', 'treasurer', 'instructor', 'door'] },
  'camp.edit': { who: 'staff', on: 'camp', roles: ['organiser'] },
  'camp.publish': { who: 'staff', on: 'camp', roles: ['organiser'] },
  'timetable.edit': { who: 'staff', on: 'camp', roles: ['organiser'] },
  'people.read': { who: 'staff', on: 'camp', roles: ['organiser', 'treasurer'] },
  'people.needs': { who: 'staff', on: 'camp', roles: ['organiser'] },
  'people.export': { who: 'staff', on: 'camp', roles: ['organiser', 'treasurer'] },
  'money.read': { who: 'staff', on: 'camp', roles: ['organiser', 'treasurer'] },
  'roster.own': { who: 'staff', on: 'camp', roles: ['instructor', 'organiser'] },
  'door.work': { who: 'staff', on: 'camp', roles: ['door', 'organiser'] },
} as const satisfies Record<string, PermissionRule>;

export type PermissionRule =
  | { who: 'anyone' | 'signed-in' | 'provider' }
  | { who: 'own'; on: 'order' | 'registration' }
  | { who: 'staff'; on: 'organisation' | 'camp'; roles: readonly StaffRole[] };

export type Permission = keyof typeof PERMISSIONS;
