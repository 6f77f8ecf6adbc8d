import 'server-only';
import { eq, inArray } from 'drizzle-orm';
import { camp } from '@/db/schema/camp';
import { type order, registration, registrationWorkshop } from '@/db/schema/order';
import { refusePlaces } from '@/lib/domain/registration/refuse-places';
import { saleState } from '@/lib/domain/registration/sale-state';
import type { Tx } from '../db';
import { confirmOrder } from './confirm-order';
import { countPlaces } from './count-places';

/** Paid after its hold ran out: takes the same places again if every one is left and the camp still sells. */
export function seatAgain(tx: Tx, row: typeof order.$inferSelect, now: number): boolean {
  const at = tx.select().from(camp).where(eq(camp.id, row.campId)).get();
  const left = countPlaces(row.campId);
  if (!at || !left || saleState(at, now) !== 'open') return false;
  const people = tx.select().from(registration).where(eq(registration.orderId, row.id)).all();
  const chosen = tx
    .select()
    .from(registrationWorkshop)
    .where(
      inArray(
        registrationWorkshop.registrationId,
        people.map(({ id }) => id),
      ),
    )
    .all();
  const wanted = people.map(({ id, trackId }) => ({
    trackId,
    electives: chosen.filter((seat) => seat.registrationId === id).map((seat) => seat.workshopId),
  }));
  if (refusePlaces(left, wanted)) return false;
  confirmOrder(tx, row, 'seat-again', now);
  return true;
}
