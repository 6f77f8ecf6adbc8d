import { Temporal } from 'temporal-polyfill';
import type { Db } from '@/db/client';
import { user } from '@/db/schema/account';
import { membership, organisation } from '@/db/schema/organisation';
import type { StaffRole } from '@/lib/domain/access/roles';
import type { Id, OrganisationId, UserId } from '@/lib/domain/shared/ids';
import { localDay } from '@/lib/domain/shared/local-time';
import { minor } from '@/lib/domain/shared/money';
import { hashPassword } from '@/lib/server/auth/hash-password';
import { DEMO_PASSWORD, SIGN_INS } from './demo-sign-ins.mjs';
import { seedCamp } from './seed-camp';

const DAY = 24 * 3_600_000;
const ZONE = 'Europe/Berlin';
const TERMS = `Until 60 days before the first day: everything but 50 EUR comes back.
Until 14 days before: half comes back.
Later: nothing comes back, but you may pass your place to another player.`;
const DESCRIPTION = `Six tracks by what you can play, not by what you call yourself. Mornings belong to your track, the hours before lunch and before supper to electives, evenings to everyone.

Every workshop says which harps it needs; your packing list adds them up. Loaners are few, so tell us early what you lack.

House rules: amplifiers stay in the Long Hall and the Barn; a harp goes into one mouth only; no wine at the repair bench.`;

/** The demo: one organisation, a sign-in for each role, one camp on sale, one that begins today, one of last year. */
export async function seedDemo(db: Db, now: number): Promise<void> {
  const today = Temporal.PlainDate.from(localDay(now, ZONE));
  const organisationId: OrganisationId = 'org_demo';
  db.insert(organisation)
    .values({
      id: organisationId,
      slug: 'slate-ridge',
      name: 'Slate Ridge Harp Society',
      email: 'office@slateridge.example',
      createdAt: now - 400 * DAY,
    })
    .run();
  const people = await seedPeople(db, organisationId, now);
  const common = {
    organisationId,
    description: DESCRIPTION,
    refundTerms: TERMS,
    instructorUserId: people.instructor,
    now,
  };
  seedCamp(db, {
    ...common,
    code: 'a',
    slug: 'kettle-lake-harp-week',
    name: 'Kettle Lake Harp Week',
    summary: 'Five days of harmonica in six tracks, at the lake.',
    startsOn: today.add({ days: 75 }).toString(),
    days: 5,
    capacity: 96,
    price: minor(46_000),
    state: 'published',
  });
  seedCamp(db, {
    ...common,
    code: 'b',
    slug: 'slate-ridge-harp-days',
    name: 'Slate Ridge Harp Days',
    summary: 'Four days, six tracks, one long porch.',
    startsOn: today.toString(),
    days: 4,
    capacity: 150,
    price: minor(38_000),
    state: 'published',
  });
  seedCamp(db, {
    ...common,
    code: 'c',
    slug: 'kettle-lake-harp-week-last-year',
    name: 'Kettle Lake Harp Week, last year',
    summary: 'Last year at the lake.',
    startsOn: today.subtract({ days: 290 }).toString(),
    days: 5,
    capacity: 96,
    price: minor(43_000),
    state: 'closed',
  });
}

async function seedPeople(
  db: Db,
  organisationId: OrganisationId,
  now: number,
): Promise<{ instructor: UserId; attendee: UserId; door: UserId }> {
  const passwordHash = await hashPassword(DEMO_PASSWORD);
  for (const { role, email, name } of SIGN_INS) {
    const id = `usr_demo${role}` as UserId;
    db.insert(user)
      .values({ id, email, name, passwordHash, emailVerifiedAt: now - 300 * DAY, createdAt: now - 300 * DAY })
      .run();
    if (role === 'attendee') continue;
    db.insert(membership)
      .values({
        id: `mbr_demo${role}` as Id<'mbr'>,
        organisationId,
        userId: id,
        role: role as StaffRole,
        createdAt: now - 300 * DAY,
      })
      .run();
  }
  return { instructor: 'usr_demoinstructor', attendee: 'usr_demoattendee', door: 'usr_demodoor' };
}
