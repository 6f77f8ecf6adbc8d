import 'server-only';
import { and, asc, eq, lte } from 'drizzle-orm';
import { order } from '@/db/schema/order';
import { getDb, inTransaction } from '../db';
import { log } from '../log';
import { endSessions } from './end-sessions';
import { lapseOrder } from './lapse-order';

const AT_ONCE = 200;

/**
 * Ends holds whose time is over: first each session at the provider, whose "no" means that the payment won, then the
 * hold itself. While the provider does not answer, the places stay taken.
 */
export async function sweepHolds(now: number): Promise<number> {
  const due = getDb()
    .select({ id: order.id })
    .from(order)
    .where(and(eq(order.state, 'held'), lte(order.heldUntil, now)))
    .orderBy(asc(order.heldUntil))
    .limit(AT_ONCE)
    .all();
  let ended = 0;
  for (const { id } of due) {
    const told = await endSessions(id, now);
    // Without an answer there will be none for the next one either; the coming round tries again.
    if (told === 'unavailable') break;
    if (told === 'refused') {
      // Its places stay taken until somebody looks, but it holds up nobody else's.
      log.error({ order: id }, 'hold not ended: the provider does not know its session');
      continue;
    }
    if (inTransaction((tx) => lapseOrder(tx, id, now))) ended += 1;
  }
  return ended;
}
