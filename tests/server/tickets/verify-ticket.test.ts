import { sign, webcrypto } from 'node:crypto';
import { expect, test } from 'vitest';
import { decodeBase45, encodeBase45 } from '@/lib/domain/tickets/base45';
import { joinTicket, keyIdText, parseTicket, ticketPayload } from '@/lib/domain/tickets/ticket-token';
import { newId } from '@/lib/server/new-id';
import { signTicket } from '@/lib/server/tickets/sign-ticket';
import { listTicketPublicKeys, ticketKey, ticketKeys } from '@/lib/server/tickets/ticket-keys';
import { verifyTicket } from '@/lib/server/tickets/verify-ticket';

const CLAIMS = { campId: newId('cmp'), ticketId: newId('tkt'), issuedAt: Date.UTC(2026, 4, 1, 9, 0, 0, 123) };
const OTHER = ticketKey(Buffer.alloc(32, 7).toString('base64url'));

test('a signed ticket verifies to its claims, and signing again gives the same text', () => {
  const text = signTicket(CLAIMS);
  expect(verifyTicket(text)).toEqual(CLAIMS);
  expect(signTicket(CLAIMS)).toBe(text);
  // ISO/IEC 18004, table 7: version 7 at level M holds 178 alphanumeric characters.
  expect(text.length).toBeLessThanOrEqual(178);
});

test('a browser verifies it with WebCrypto and the listed public key', async () => {
  const read = parseTicket(signTicket(CLAIMS));
  const listed = listTicketPublicKeys().find(({ keyId }) => keyId === read?.keyId);
  const raw = Buffer.from(listed?.publicKey ?? '', 'base64url');
  const key = await webcrypto.subtle.importKey('raw', raw, 'Ed25519', false, ['verify']);
  if (!read) throw new Error('not read');
  expect(await webcrypto.subtle.verify('Ed25519', key, read.signature, read.message)).toBe(true);
});

// OWASP ASVS 5.0, 9.1.1 and 9.1.2: nothing of a changed token is believed.
test('every single flipped bit voids it', () => {
  const bytes = decodeBase45(signTicket(CLAIMS)) ?? new Uint8Array();
  for (let bit = 0; bit < bytes.length * 8; bit += 1) {
    const flipped = Uint8Array.from(bytes);
    flipped[bit >> 3] = (flipped[bit >> 3] ?? 0) ^ (1 << (bit & 7));
    expect(verifyTicket(encodeBase45(flipped))).toBeNull();
  }
});

// ASVS 9.1.3: only keys of our own list, never one that the token brings along.
test('another key does not pass, nor does it under our key id', () => {
  expect(verifyTicket(signTicket(CLAIMS, OTHER))).toBeNull();
  const ours = ticketKeys().signing.keyId;
  expect(verifyTicket(signTicket(CLAIMS, { ...OTHER, keyId: ours }))).toBeNull();
});

// ASVS 9.2.3: a token for another camp carries that camp's id; it cannot be given ours.
test('the camp cannot be exchanged', () => {
  const { signing } = ticketKeys();
  const elsewhere = decodeBase45(signTicket({ ...CLAIMS, campId: newId('cmp') })) ?? new Uint8Array();
  const forged = joinTicket(ticketPayload(signing.keyId, CLAIMS), elsewhere.slice(-64));
  expect(verifyTicket(forged)).toBeNull();
});

// ASVS 9.2.2: a signature by the same key over the same bytes, but made for another purpose.
test('a signature of another kind does not pass', () => {
  const { signing } = ticketKeys();
  const payload = ticketPayload(signing.keyId, CLAIMS);
  expect(verifyTicket(joinTicket(payload, sign(null, payload, signing.privateKey)))).toBeNull();
  const other = Buffer.concat([Buffer.from('combwood badge v1\0'), payload]);
  expect(verifyTicket(joinTicket(payload, sign(null, other, signing.privateKey)))).toBeNull();
});

test.each(['', ' ', 'HELLO', 'https://example.test/ticket', '%69 VD92EX0', '🎶', 'A'.repeat(5000)])(
  'noise is no ticket: %s',
  (text) => {
    expect(verifyTicket(text)).toBeNull();
  },
);

test('keys rotate: a ticket of an earlier seed stays good while that seed is listed', () => {
  const text = signTicket(CLAIMS, OTHER);
  const listed = new Map([[keyIdText(OTHER.keyId), OTHER.publicKey], ...ticketKeys().all]);
  expect(verifyTicket(text, listed)).toEqual(CLAIMS);
  expect(verifyTicket(signTicket(CLAIMS), listed)).toEqual(CLAIMS);
});
