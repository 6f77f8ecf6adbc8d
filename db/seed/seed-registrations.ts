import { and, eq, ne } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { mail } from '@/db/schema/mail';
import { registration } from '@/db/schema/order';
import { harpId } from '@/lib/domain/harp/harp-id';
import type { CompleteAnswers } from '@/lib/domain/registration/answers';
import type { RegistrationState } from '@/lib/domain/registration/states';
import type { RegistrationId, UserId, WorkshopId } from '@/lib/domain/shared/ids';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { recordScan } from '@/lib/server/door/record-scan';
import type { SeededCamp } from './seed-camp';
import { seedPerson } from './seed-person';
import type { SeededRandom } from './seeded-random';

const DAY = 24 * 3_600_000;
const OWNED = ['C', 'A', 'G', 'D', 'F', 'Bb', 'E'] as const;
const DIETS = [
  'Vegetarian',
  'Vegan',
  'No nuts: severe allergy, carries adrenaline',
  'No gluten (coeliac)',
  'Halal',
  'No lactose',
];
const ACCESS = [
  'Ground-floor room, please: stairs are hard',
  'Hearing aid: a seat near the front',
  'Uses a wheelchair',
];

type CampPeople = {
  camp: SeededCamp;
  names: string[];
  heirs: string[];
  /** Fates other than confirmed, by index; everyone else is confirmed. */
  fates: ReadonlyMap<number, RegistrationState>;
  /** Epoch ms between which people registered. */
  from: number;
  to: number;
  /** Index → account. */
  accounts: ReadonlyMap<number, UserId>;
  code: string;
  random: SeededRandom;
  now: number;
};

/** Registers a camp's people one after the other; answers the registration of each, in the order of `names`. */
export function seedRegistrations(db: Db, given: CampPeople): RegistrationId[] {
  const { camp, random } = given;
  const programme = loadProgramme(camp.id);
  if (!programme) throw new Error(`No camp ${camp.id}`);
  const seats = new Map(
    programme.workshops.map((workshop) => [workshop.id, workshop.capacity ?? Number.POSITIVE_INFINITY]),
  );
  return given.names.map((name, index) => {
    const fate = given.fates.get(index) ?? 'confirmed';
    const trackId = camp.tracks[index % camp.tracks.length];
    if (!trackId) throw new Error('The camp has no tracks');
    const electives = fate === 'waitlisted' ? [] : chooseElectives(camp, seats, random);
    const answers = answersOf(given, name, index, { trackId, electives });
    const at = Math.round(given.from + ((given.to - given.from) * index) / given.names.length);
    const heir = given.heirs[index % given.heirs.length] ?? name;
    const plan = {
      programme,
      answers,
      userId: given.accounts.get(index) ?? null,
      fate,
      at,
      now: given.now,
      heir,
      code: `${given.code}${index}`,
    };
    return db.transaction((tx) => seedPerson(tx, plan).registrationId, { behavior: 'immediate' });
  });
}

/** Up to two electives that still have seats and never meet at the same time. */
function chooseElectives(
  camp: SeededCamp,
  seats: Map<WorkshopId, number>,
  random: SeededRandom,
): WorkshopId[] {
  const taken = new Set<string>();
  const chosen: WorkshopId[] = [];
  for (let tries = 0; tries < 4 && chosen.length < 2; tries += 1) {
    const { id, slots } = random.pick(camp.electives);
    if (chosen.includes(id) || (seats.get(id) ?? 0) < 1 || slots.some((slot) => taken.has(slot))) continue;
    chosen.push(id);
    seats.set(id, (seats.get(id) ?? 0) - 1);
    for (const slot of slots) taken.add(slot);
  }
  return chosen;
}

function answersOf(
  given: CampPeople,
  name: string,
  index: number,
  track: CompleteAnswers['track'],
): CompleteAnswers {
  const { random } = given;
  const minor = index % 27 === 9;
  const email = given.accounts.has(index) ? 'oskar@players.example' : `player${index + 1}@players.example`;
  // More advanced tracks own more harps.
  const level = given.camp.tracks.indexOf(track.trackId);
  const harps = OWNED.filter((_, at) => at === 0 || random.chance(0.15 + 0.12 * level));
  return {
    who: {
      attendeeName: name,
      attendeeEmail: email,
      payer: 'attendee',
      payerName: '',
      payerEmail: '',
      minor,
    },
    track,
    harps: { harpIds: harps.map((root) => harpId({ root, tuning: 'richter', register: 'standard' })) },
    needs: {
      diet: random.chance(0.2) ? random.pick(DIETS) : '',
      access: random.chance(0.05) ? random.pick(ACCESS) : '',
      emergencyName: `Family of ${name}`,
      emergencyPhone: `+4930555${String(1000 + index)}`,
      guardianName: minor ? `Parent of ${name}` : '',
      guardianEmail: minor ? `parent${index + 1}@players.example` : '',
      guardianPhone: minor ? `+4930556${String(1000 + index)}` : '',
      // One guardian has not agreed yet, so that the door can show what happens then.
      consent: minor && index !== 9,
    },
  };
}

/** Marks people as arrived through the door's own use-case, some minutes ago. */
export function seedArrivals(given: {
  camp: SeededCamp;
  people: RegistrationId[];
  by: UserId;
  now: number;
}): void {
  given.people.forEach((registrationId, index) => {
    const now = given.now - (given.people.length - index) * 60_000;
    const id = `00000000-0000-4000-8000-${String(index).padStart(12, '0')}`;
    recordScan(given.camp.id, { kind: 'name', id, deviceAt: now, registrationId }, { userId: given.by, now });
  });
}

/** A camp that is over: nearly everyone came and left, a few never did. */
export function seedPastArrivals(db: Db, camp: SeededCamp, endedAt: number): void {
  const people = db
    .select({ id: registration.id })
    .from(registration)
    .where(and(eq(registration.campId, camp.id), eq(registration.state, 'confirmed')))
    .all();
  people.forEach(({ id }, index) => {
    const came = index % 24 !== 7;
    db.update(registration)
      .set({ arrival: came ? 'left' : 'no-show', arrivedAt: came ? endedAt - 4 * DAY : null })
      .where(eq(registration.id, id))
      .run();
  });
}

/** The demo's mails of months ago are not sent today; the one attendee who can sign in gets theirs. */
export function settleMail(db: Db, except: string, now: number): void {
  db.update(mail).set({ state: 'sent', sentAt: now, payload: {} }).where(ne(mail.toEmail, except)).run();
}
