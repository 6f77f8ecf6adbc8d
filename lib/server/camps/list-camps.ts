import 'server-only';
import { and, count, desc, eq, inArray } from 'drizzle-orm';
import { camp } from '@/db/schema/camp';
import { registration } from '@/db/schema/order';
import type { Actor } from '@/lib/domain/access/actor';
import type { CampState } from '@/lib/domain/camp/camp-words';
import { SEATED_STATES } from '@/lib/domain/registration/states';
import type { CampId, OrganisationId } from '@/lib/domain/shared/ids';
import { ownedBy } from '../access/owned-by';
import { getDb } from '../db';

export type CampLine = {
  id: CampId;
  organisationId: OrganisationId;
  name: string;
  state: CampState;
  startsOn: string;
  endsOn: string;
  timeZone: string;
  currency: string;
  venueName: string;
  capacity: number;
  taken: number;
};

/** The camps that the actor's roles let them see, latest first; two statements however many there are. */
export function listCamps(actor: Actor, organisationId?: OrganisationId): CampLine[] {
  const db = getDb();
  const mine = and(
    ownedBy(actor, 'camp.read', camp.organisationId),
    organisationId ? eq(camp.organisationId, organisationId) : undefined,
  );
  const taken = new Map(
    db
      .select({ id: registration.campId, taken: count() })
      .from(registration)
      .innerJoin(camp, eq(camp.id, registration.campId))
      .where(and(mine, inArray(registration.state, [...SEATED_STATES])))
      .groupBy(registration.campId)
      .all()
      .map((row) => [row.id, row.taken]),
  );
  return db
    .select({
      id: camp.id,
      organisationId: camp.organisationId,
      name: camp.name,
      state: camp.state,
      startsOn: camp.startsOn,
      endsOn: camp.endsOn,
      timeZone: camp.timeZone,
      currency: camp.currency,
      venueName: camp.venueName,
      capacity: camp.capacity,
    })
    .from(camp)
    .where(mine)
    .orderBy(desc(camp.startsOn), camp.id)
    .all()
    .map((row) => ({ ...row, taken: taken.get(row.id) ?? 0 }));
}
