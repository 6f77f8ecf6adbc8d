import 'server-only';
import { createHash, createPrivateKey, createPublicKey, type KeyObject } from 'node:crypto';
import { keyIdText } from '@/lib/domain/tickets/ticket-token';
import { env } from '../env';

export type TicketKey = {
  /** The first four bytes of the public key's SHA-256: tells keys apart, proves nothing. */
  keyId: Uint8Array;
  privateKey: KeyObject;
  publicKey: KeyObject;
};

// RFC 8410: an Ed25519 private key in PKCS #8 is this head and the 32-byte seed.
const PKCS8_HEAD = Buffer.from('302e020100300506032b657004220420', 'hex');

export const rawPublicKey = (key: KeyObject): Buffer =>
  Buffer.from(key.export({ format: 'jwk' }).x ?? '', 'base64url');

/** The key pair of a 32-byte seed in base64url. */
export function ticketKey(seed: string): TicketKey {
  const der = Buffer.concat([PKCS8_HEAD, Buffer.from(seed, 'base64url')]);
  const privateKey = createPrivateKey({ key: der, format: 'der', type: 'pkcs8' });
  const publicKey = createPublicKey(privateKey);
  const keyId = createHash('sha256').update(rawPublicKey(publicKey)).digest().subarray(0, 4);
  return { keyId, privateKey, publicKey };
}

let keys: { source: string; signing: TicketKey; all: Map<string, KeyObject> } | undefined;

/** The key that signs, and every key that is still believed: today's and those of earlier seeds. */
export function ticketKeys(): { signing: TicketKey; all: ReadonlyMap<string, KeyObject> } {
  const { TICKET_SEED, TICKET_OLD_SEEDS } = env();
  const source = [TICKET_SEED, ...TICKET_OLD_SEEDS].join(' ');
  if (keys?.source === source) return keys;
  const pairs = [TICKET_SEED, ...TICKET_OLD_SEEDS].map(ticketKey);
  const [signing] = pairs;
  if (!signing) throw new Error('No ticket key');
  keys = {
    source,
    signing,
    all: new Map(pairs.map((pair) => [keyIdText(pair.keyId), pair.publicKey])),
  };
  return keys;
}

/** For a device that verifies without the server: key id in hex and the raw public key in base64url. */
export const listTicketPublicKeys = (): { keyId: string; publicKey: string }[] =>
  [...ticketKeys().all].map(([keyId, key]) => ({
    keyId,
    publicKey: rawPublicKey(key).toString('base64url'),
  }));
