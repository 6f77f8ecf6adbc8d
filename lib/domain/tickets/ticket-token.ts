import { type CampId, isId, type TicketId } from '../shared/ids';
import { decodeBase45, encodeBase45 } from './base45';
import { packId, unpackId } from './pack-id';

/** What a ticket says. Who it is for is looked up: the code carries no name and no personal data. */
export type TicketClaims = {
  campId: CampId;
  ticketId: TicketId;
  /** Epoch ms. */
  issuedAt: number;
};

const VERSION = 1;
const KEY_ID_BYTES = 4;
const TIME_BYTES = 6;
const SIGNATURE_BYTES = 64;
// Two ids of 40 characters, the longest there may be, and the rest; a longer text is no ticket and is not decoded.
const LONGEST = 256;

// Names what is signed, so that a signature made for anything else never opens a door.
const PURPOSE = new TextEncoder().encode('combwood ticket v1\0');

/** The bytes that the signature covers besides the purpose: version, key id, camp, ticket, time of issue. */
export function ticketPayload(keyId: Uint8Array, claims: TicketClaims): Uint8Array<ArrayBuffer> {
  const { campId, ticketId, issuedAt } = claims;
  if (!isId('cmp', campId) || !isId('tkt', ticketId)) throw new RangeError('Not the ids of a ticket');
  if (keyId.length !== KEY_ID_BYTES || !Number.isSafeInteger(issuedAt) || issuedAt < 0 || issuedAt >= 2 ** 48)
    throw new RangeError('Not a key id or time of a ticket');
  const time = Array.from(
    { length: TIME_BYTES },
    (_, at) => Math.floor(issuedAt / 256 ** (TIME_BYTES - 1 - at)) % 256,
  );
  return Uint8Array.from([VERSION, ...keyId, ...packId(campId), ...packId(ticketId), ...time]);
}

/** What Ed25519 signs and verifies: the purpose, then the payload. */
export const ticketMessage = (payload: Uint8Array): Uint8Array<ArrayBuffer> =>
  Uint8Array.from([...PURPOSE, ...payload]);

/** The text of the QR code: payload and signature in base45, upper case, so that the code stays small. */
export const joinTicket = (payload: Uint8Array, signature: Uint8Array): string =>
  encodeBase45(Uint8Array.from([...payload, ...signature]));

/** A ticket as read. Nothing of it is true until `signature` is verified over `message` with the key of `keyId`. */
export type ReadTicket = TicketClaims & {
  /** Hex. */
  keyId: string;
  message: Uint8Array<ArrayBuffer>;
  signature: Uint8Array<ArrayBuffer>;
};

/** Reads a scanned text; null for anything that is not a ticket of this version. Never throws. */
export function parseTicket(text: string): ReadTicket | null {
  if (text.length > LONGEST) return null;
  const bytes = decodeBase45(text);
  if (!bytes || bytes[0] !== VERSION) return null;
  const camp = unpackId('cmp', bytes, 1 + KEY_ID_BYTES);
  const ticket = camp && unpackId('tkt', bytes, camp.next);
  if (!ticket || bytes.length !== ticket.next + TIME_BYTES + SIGNATURE_BYTES) return null;
  const end = ticket.next + TIME_BYTES;
  return {
    campId: camp.id,
    ticketId: ticket.id,
    issuedAt: bytes.slice(ticket.next, end).reduce((sum, byte) => sum * 256 + byte, 0),
    keyId: keyIdText(bytes.slice(1, 1 + KEY_ID_BYTES)),
    message: ticketMessage(bytes.slice(0, end)),
    signature: bytes.slice(end),
  };
}

export const keyIdText = (keyId: Uint8Array): string =>
  [...keyId].map((byte) => byte.toString(16).padStart(2, '0')).join('');
