import 'server-only';
import { and, eq, inArray, lt, ne, or } from 'drizzle-orm';
import { camp } from '@/db/schema/camp';
import { registration, registrationNeeds } from '@/db/schema/order';
import { NEEDS_KEPT_DAYS } from '@/lib/domain/registration/needs-kept-days';
import { localDay } from '@/lib/domain/shared/local-time';
import { getDb, inTransaction } from '../db';

const DAY = 24 * 60 * 60_000;

/**
 * Blanks food, access and contact details some days after the camp, and of holds that ran out. The row stays, with
 * when a guardian agreed and to what.
 */
export function purgeNeeds(now: number): number {
  // A day of slack for zones: the border is a date, and no zone is further than 14 hours from UTC.
  const endedBefore = localDay(now - NEEDS_KEPT_DAYS * DAY, 'UTC');
  const due = getDb()
    .select({ id: registrationNeeds.registrationId })
    .from(registrationNeeds)
    .innerJoin(registration, eq(registration.id, registrationNeeds.registrationId))
    .innerJoin(camp, eq(camp.id, registration.campId))
    .where(
      and(
        ne(registrationNeeds.emergencyName, ''),
        or(
          lt(camp.endsOn, endedBefore),
          and(eq(registration.state, 'expired'), lt(registration.updatedAt, now - NEEDS_KEPT_DAYS * DAY)),
        ),
      ),
    )
    .limit(500)
    .all()
    .map(({ id }) => id);
  if (due.length === 0) return 0;
  return inTransaction(
    (tx) =>
      tx
        .update(registrationNeeds)
        .set({
          diet: '',
          access: '',
          emergencyName: '',
          emergencyPhone: '',
          guardianName: '',
          guardianEmail: '',
          guardianPhone: '',
        })
        .where(inArray(registrationNeeds.registrationId, due))
        .run().changes,
  );
}
