import type { Permission } from '@/lib/domain/access/permissions';

type Who = 'organiser' | 'treasurer' | 'instructor' | 'door' | 'attendee' | 'visitor';
const EVERYONE: Who[] = ['organiser', 'treasurer', 'instructor', 'door', 'attendee', 'visitor'];
const SIGNED_IN: Who[] = ['organiser', 'treasurer', 'instructor', 'door', 'attendee'];
const STAFF: Who[] = ['organiser', 'treasurer', 'instructor', 'door'];

/**
 * Who may do what, written by hand from what each role is for: organisers everything of their organisation, the
 * treasurer money and the people who owe it, instructors their own sessions, the door arrivals, attendees what they
 * booked. `row`: only on a row of one's own. "attendee" here is the payer of the order that is asked about.
 */
export const EXPECTED: Record<Permission, { may: Who[]; row: boolean }> = {
  'public.read': { may: EVERYONE, row: false },
  'registration.draft': { may: EVERYONE, row: false },
  'registration.submit': { may: EVERYONE, row: false },
  'account.open': { may: EVERYONE, row: false },
  'account.own': { may: SIGNED_IN, row: false },
  'invitation.accept': { may: SIGNED_IN, row: false },
  'organisation.create': { may: SIGNED_IN, row: false },
  'order.read': { may: ['attendee'], row: true },
  'order.pay': { may: ['attendee'], row: true },
  'registration.read': { may: ['attendee'], row: true },
  'payment.notify': { may: [], row: false },
  'organisation.read': { may: STAFF, row: true },
  'organisation.edit': { may: ['organiser'], row: true },
  'staff.manage': { may: ['organiser'], row: true },
  'camp.create': { may: ['organiser'], row: true },
  'camp.read': { may: STAFF, row: true },
  'camp.edit': { may: ['organiser'], row: true },
  'camp.publish': { may: ['organiser'], row: true },
  'timetable.edit': { may: ['organiser'], row: true },
  'people.read': { may: ['organiser', 'treasurer'], row: true },
  'people.needs': { may: ['organiser'], row: true },
  'people.export': { may: ['organiser', 'treasurer'], row: true },
  'money.read': { may: ['organiser', 'treasurer'], row: true },
  'roster.own': { may: ['organiser', 'instructor'], row: true },
  'door.work': { may: ['organiser', 'door'], row: true },
};
