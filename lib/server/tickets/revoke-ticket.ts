import 'server-only';
import { and, eq, isNull } from 'drizzle-orm';
import { ticket } from '@/db/schema/order';
import type { RegistrationId } from '@/lib/domain/shared/ids';
import type { Tx } from '../db';

/** Ends a registration's ticket: its code still reads, and the door says that it is no longer valid. */
export function revokeTicket(tx: Tx, given: { registrationId: RegistrationId; now: number }): void {
  tx.update(ticket)
    .set({ revokedAt: given.now })
    .where(and(eq(ticket.registrationId, given.registrationId), isNull(ticket.revokedAt)))
    .run();
}
