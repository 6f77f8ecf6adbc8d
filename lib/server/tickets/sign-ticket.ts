import 'server-only';
import { sign } from 'node:crypto';
import {
  joinTicket,
  type TicketClaims,
  ticketMessage,
  ticketPayload,
} from '@/lib/domain/tickets/ticket-token';
import { type TicketKey, ticketKeys } from './ticket-keys';

/** The text of a ticket's QR code. Ed25519 is deterministic: the same ticket is the same code each time it is shown. */
export function signTicket(claims: TicketClaims, key: TicketKey = ticketKeys().signing): string {
  const payload = ticketPayload(key.keyId, claims);
  return joinTicket(payload, sign(null, ticketMessage(payload), key.privateKey));
}
