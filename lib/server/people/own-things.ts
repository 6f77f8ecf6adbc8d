import 'server-only';
import { asc, eq, type SQL } from 'drizzle-orm';
import { registration, registrationHarp, registrationWorkshop } from '@/db/schema/order';
import { workshop } from '@/db/schema/workshop';
import { harpLabels } from '@/lib/domain/harp/harp-labels';
import type { RegistrationId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';

function gather(rows: readonly { id: RegistrationId; value: string }[]): Map<RegistrationId, string[]> {
  const by = new Map<RegistrationId, string[]>();
  for (const { id, value } of rows) {
    const own = by.get(id);
    if (own) own.push(value);
    else by.set(id, [value]);
  }
  return by;
}

/** Titles of the electives each has taken, of the registrations that `where` picks; one statement. */
export const electivesOf = (where: SQL): Map<RegistrationId, string[]> =>
  gather(
    getDb()
      .select({ id: registrationWorkshop.registrationId, value: workshop.title })
      .from(registrationWorkshop)
      .innerJoin(workshop, eq(workshop.id, registrationWorkshop.workshopId))
      .innerJoin(registration, eq(registration.id, registrationWorkshop.registrationId))
      .where(where)
      .orderBy(asc(workshop.title), asc(workshop.id))
      .all(),
  );

/** Labels of the harps each owns, lowest first; one statement. */
export function harpsOf(where: SQL): Map<RegistrationId, string[]> {
  const owned = gather(
    getDb()
      .select({ id: registrationHarp.registrationId, value: registrationHarp.harpId })
      .from(registrationHarp)
      .innerJoin(registration, eq(registration.id, registrationHarp.registrationId))
      .where(where)
      .all(),
  );
  return new Map([...owned].map(([id, harps]) => [id, harpLabels(harps)]));
}
