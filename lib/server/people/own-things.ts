import 'server-only';
import { asc, eq, inArray } from 'drizzle-orm';
import { registrationHarp, registrationWorkshop } from '@/db/schema/order';
import { workshop } from '@/db/schema/workshop';
import { harpLabels } from '@/lib/domain/harp/harp-labels';
import type { RegistrationId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';

const gather = (rows: readonly { id: RegistrationId; value: string }[]): Map<RegistrationId, string[]> => {
  const by = new Map<RegistrationId, string[]>();
  for (const { id, value } of rows) by.set(id, [...(by.get(id) ?? []), value]);
  return by;
};

/** Titles of the electives each has taken; one statement. */
export const electivesOf = (ids: readonly RegistrationId[]): Map<RegistrationId, string[]> =>
  gather(
    getDb()
      .select({ id: registrationWorkshop.registrationId, value: workshop.title })
      .from(registrationWorkshop)
      .innerJoin(workshop, eq(workshop.id, registrationWorkshop.workshopId))
      .where(inArray(registrationWorkshop.registrationId, [...ids]))
      .orderBy(asc(workshop.title), asc(workshop.id))
      .all(),
  );

/** Labels of the harps each owns, lowest first; one statement. */
export function harpsOf(ids: readonly RegistrationId[]): Map<RegistrationId, string[]> {
  const owned = gather(
    getDb()
      .select({ id: registrationHarp.registrationId, value: registrationHarp.harpId })
      .from(registrationHarp)
      .where(inArray(registrationHarp.registrationId, [...ids]))
      .all(),
  );
  return new Map([...owned].map(([id, harps]) => [id, harpLabels(harps)]));
}
