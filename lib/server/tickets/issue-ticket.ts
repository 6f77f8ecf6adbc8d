import 'server-only';
import { and, eq, isNull } from 'drizzle-orm';
import { ticket } from '@/db/schema/order';
import type { CampId, RegistrationId, TicketId } from '@/lib/domain/shared/ids';
import type { Tx } from '../db';
import { newId } from '../new-id';

/** Gives a confirmed registration its one valid ticket; a second call finds it (an index refuses two). */
export function issueTicket(
  tx: Tx,
  given: { registrationId: RegistrationId; campId: CampId; now: number },
): TicketId {
  const { registrationId, campId, now } = given;
  const held = tx
    .select({ id: ticket.id })
    .from(ticket)
    .where(and(eq(ticket.registrationId, registrationId), isNull(ticket.revokedAt)))
    .get();
  if (held) return held.id;
  const id = newId('tkt', now);
  tx.insert(ticket).values({ id, registrationId, campId, issuedAt: now }).run();
  return id;
}
