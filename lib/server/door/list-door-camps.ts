import 'server-only';
import { and, asc, inArray, ne } from 'drizzle-orm';
import { camp } from '@/db/schema/camp';
import type { Actor } from '@/lib/domain/access/actor';
import { PERMISSIONS } from '@/lib/domain/access/permissions';
import { getDb } from '../db';

/** The camps whose door this person may work, earliest first; drafts have no door yet. */
export function listDoorCamps(actor: Actor) {
  const roles: readonly string[] = PERMISSIONS['door.work'].roles;
  const organisations = actor.roles
    .filter(({ role }) => roles.includes(role))
    .map((held) => held.organisationId);
  if (organisations.length === 0) return [];
  return getDb()
    .select({
      id: camp.id,
      name: camp.name,
      startsOn: camp.startsOn,
      endsOn: camp.endsOn,
      timeZone: camp.timeZone,
      arrivalFrom: camp.arrivalFrom,
    })
    .from(camp)
    .where(and(inArray(camp.organisationId, organisations), ne(camp.state, 'draft')))
    .orderBy(asc(camp.startsOn), asc(camp.id))
    .all();
}
