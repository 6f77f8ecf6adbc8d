import 'server-only';
import { type KeyObject, verify } from 'node:crypto';
import { parseTicket, type TicketClaims } from '@/lib/domain/tickets/ticket-token';
import { ticketKeys } from './ticket-keys';

/**
 * The claims of a ticket that one of our keys signed; null for anything else. It says nothing of today: whether the
 * ticket was revoked, or is for another camp, is for the caller to look up by its ids.
 */
export function verifyTicket(
  text: string,
  keys: ReadonlyMap<string, KeyObject> = ticketKeys().all,
): TicketClaims | null {
  const read = parseTicket(text);
  const key = read && keys.get(read.keyId);
  if (!key || !verify(null, read.message, key, read.signature)) return null;
  return { campId: read.campId, ticketId: read.ticketId, issuedAt: read.issuedAt };
}
