import { Temporal } from 'temporal-polyfill';
import type { Db } from '@/db/client';
import { user } from '@/db/schema/account';
import { membership, organisation } from '@/db/schema/organisation';
import { type Actor, VISITOR } from '@/lib/domain/access/actor';
import type { StaffRole } from '@/lib/domain/access/roles';
import type { RegistrationState } from '@/lib/domain/registration/states';
import type { Id, OrganisationId, UserId } from '@/lib/domain/shared/ids';
import { localDay } from '@/lib/domain/shared/local-time';
import { minor } from '@/lib/domain/shared/money';
import { hashPassword } from '@/lib/server/auth/hash-password';
import { addPicture } from '@/lib/server/pictures/add-picture';
import { DEMO_PASSWORD, SIGN_INS } from './demo-sign-ins.mjs';
import { DEMO_PICTURES, pngOf } from './draw-picture';
import { demoNames } from './people-names';
import { seedCamp } from './seed-camp';
import { seedArrivals, seedPastArrivals, seedRegistrations, settleMail } from './seed-registrations';
import { seededRandom } from './seeded-random';

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
  const selling = seedCamp(db, {
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
  const arriving = seedCamp(db, {
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
  const past = seedCamp(db, {
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
  const organiser = actorOf(people.organiser, organisationId);
  for (const { alt, draw } of DEMO_PICTURES)
    for (const { id } of [selling, arriving]) {
      const added = await addPicture({ campId: id, alt, file: await pngOf(draw) }, { actor: organiser, now });
      if (!added.ok) throw new Error(added.error.sentence ?? added.error.code);
    }
  const names = demoNames(240);
  const random = seededRandom(1857);
  // Oskar, the first name, is the attendee who can sign in.
  const shared = { heirs: names.slice(230), accounts: new Map([[0, people.attendee]]), random, now };
  const lastYear = now - 290 * DAY;
  seedRegistrations(db, {
    ...shared,
    camp: past,
    names: names.slice(0, 88),
    fates: fates({ cancelled: [5, 40], expired: [11] }),
    from: lastYear - 150 * DAY,
    to: lastYear - 20 * DAY,
    code: 'c',
  });
  settleMail(db, '', now);
  seedPastArrivals(db, past, lastYear + 5 * DAY);
  const people140 = seedRegistrations(db, {
    ...shared,
    camp: arriving,
    names: names.slice(0, 140),
    fates: fates(TODAY),
    from: now - 120 * DAY,
    to: now - 2 * DAY,
    code: 'b',
  });
  seedArrivals({ camp: arriving, people: people140.slice(20, 52), by: people.door, now });
  seedRegistrations(db, {
    ...shared,
    camp: selling,
    names: [...names.slice(0, 1), ...names.slice(140, 199)],
    fates: fates({ held: [57, 59], expired: [22, 31], cancelled: [18] }),
    from: now - 60 * DAY,
    to: now - DAY,
    code: 'a',
  });
  settleMail(db, 'oskar@players.example', now);
}

/** The organiser as the use-cases know them. */
const actorOf = (id: UserId, organisationId: OrganisationId): Actor => ({
  ...VISITOR,
  user: { id, name: 'Ana Teixeira', email: 'ana@slateridge.example', emailVerified: true },
  roles: [{ organisationId, role: 'organiser' }],
});

/** Who of today's camp is not simply confirmed; indexes into its list of people. */
const TODAY = {
  held: [131, 136],
  waitlisted: [133, 137, 139],
  offered: [138],
  cancelled: [14, 33, 71, 96, 118],
  transferred: [60, 101],
  expired: [17, 45, 84, 110],
} satisfies Partial<Record<RegistrationState, number[]>>;

const fates = (of: Partial<Record<RegistrationState, number[]>>): Map<number, RegistrationState> =>
  new Map(
    Object.entries(of).flatMap(([state, indexes]) =>
      indexes.map((index) => [index, state as RegistrationState]),
    ),
  );

async function seedPeople(
  db: Db,
  organisationId: OrganisationId,
  now: number,
): Promise<{ organiser: UserId; instructor: UserId; attendee: UserId; door: UserId }> {
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
  return {
    organiser: 'usr_demoorganiser',
    instructor: 'usr_demoinstructor',
    attendee: 'usr_demoattendee',
    door: 'usr_demodoor',
  };
}
