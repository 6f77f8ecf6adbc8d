import { and, asc, eq } from 'drizzle-orm';
import { openDatabase } from '@/db/client';
import { session } from '@/db/schema/account';
import { registration, ticket } from '@/db/schema/order';
import type { RegistrationId, TicketId } from '@/lib/domain/shared/ids';
import { hashToken, newToken } from '@/lib/server/hash-token';
import { newId } from '@/lib/server/new-id';
import { signTicket } from '@/lib/server/tickets/sign-ticket';
import { buildCamp } from '../builders/build-camp';
import { buildCrowd } from '../builders/build-crowd';
import { buildLargeProgramme } from '../builders/build-large-programme';
import { buildUser } from '../builders/build-user';

export const PEOPLE = 10_000;
const DAY = 24 * 3_600_000;

/** Beside the demo: a camp of ten thousand people, tickets for those confirmed, and somebody signed in who runs it. */
export function fillBench(file: string): { cookie: string; codes: string[]; registrationId: RegistrationId } {
  const db = openDatabase(file);
  const now = Date.now();
  const { campId, organisationId, beginners, benders, hall } = buildCamp(db, { capacity: 2 * PEOPLE });
  const tracks = { campId, trackIds: [beginners, benders] };
  const [, , , workshopId] = buildLargeProgramme(db, 60, { ...tracks, roomId: hall });
  buildCrowd(db, PEOPLE, { ...tracks, workshopId });
  db.update(registration)
    .set({ arrival: 'expected', arrivedAt: null })
    .where(eq(registration.campId, campId))
    .run();
  const userId = buildUser(db, { id: 'usr_bench', in: organisationId, roles: ['organiser', 'door'] });
  const token = newToken();
  db.insert(session)
    .values({
      id: hashToken(token),
      userId,
      expiresAt: Math.floor((now + 7 * DAY) / 1000),
      endsAt: now + 7 * DAY,
      createdAt: now,
      device: 'bench',
    })
    .run();
  const confirmed = db
    .select({ id: registration.id })
    .from(registration)
    // The crowd's minors have no consent on record, and the door does not let those in.
    .where(
      and(
        eq(registration.campId, campId),
        eq(registration.state, 'confirmed'),
        eq(registration.minor, false),
      ),
    )
    .orderBy(asc(registration.id))
    .all();
  const codes = db.transaction((tx) =>
    confirmed.map(({ id: registrationId }) => {
      const id: TicketId = newId('tkt', now);
      tx.insert(ticket).values({ id, registrationId, campId, issuedAt: now }).run();
      return signTicket({ ticketId: id, campId, issuedAt: now });
    }),
  );
  const registrationId = confirmed[0]?.id;
  if (!registrationId) throw new Error('The crowd has nobody who is confirmed');
  db.update(registration).set({ attendeeUserId: userId }).where(eq(registration.id, registrationId)).run();
  db.$client.close();
  return { cookie: `combwood_session=${token}`, codes, registrationId };
}
