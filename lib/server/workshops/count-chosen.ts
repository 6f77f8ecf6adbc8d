import 'server-only';
import { and, count, eq, inArray } from 'drizzle-orm';
import { registration, registrationWorkshop } from '@/db/schema/order';
import { SEATED_STATES } from '@/lib/domain/registration/states';
import type { WorkshopId } from '@/lib/domain/shared/ids';
import type { Tx } from '../db';

/** Players with a seat in an elective: those whose registration holds a place. */
export function countChosen(tx: Tx, workshopId: WorkshopId): number {
  const row = tx
    .select({ n: count() })
    .from(registrationWorkshop)
    .innerJoin(registration, eq(registration.id, registrationWorkshop.registrationId))
    .where(
      and(eq(registrationWorkshop.workshopId, workshopId), inArray(registration.state, [...SEATED_STATES])),
    )
    .get();
  return row?.n ?? 0;
}
