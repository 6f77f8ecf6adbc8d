import { createPublicKey, sign, verify, webcrypto } from 'node:crypto';
import { ed25519 } from '@noble/curves/ed25519.js';
import { expect, test } from 'vitest';
import { rawPublicKey, ticketKey } from '@/lib/server/tickets/ticket-keys';

const hex = (text: string) => Buffer.from(text, 'hex');

// RFC 8032, section 7.1, tests 1 to 3: secret key, public key, message, signature.
const VECTORS: [string, string, string, string][] = [
  [
    '9d61b19deffd5a60ba844af492ec2cc44449c5697b326919703bac031cae7f60',
    'd75a980182b10ab7d54bfed3c964073a0ee172f3daa62325af021a68f707511a',
    '',
    'e5564300c360ac729086e2cc806e828a84877f1eb8e5d974d873e065224901555fb8821590a33bacc61e39701cf9b46bd25bf5f0595bbe24655141438e7a100b',
  ],
  [
    '4ccd089b28ff96da9db6c346ec114e0f5b8a319f35aba624da8cf6ed4fb8a6fb',
    '3d4017c3e843895a92b70aa74d1b7ebc9c982ccf2ec4968cc0cd55f12af4660c',
    '72',
    '92a009a9f0d4cab8720e820b5f642540a2b27b5416503f8fb3762223ebdb69da085ac1e43e15996e458f3613d0f11d8c387b2eaeb4302aeeb00d291612bb0c00',
  ],
  [
    'c5aa8df43f9f837bedb7442f31dcb7b166d38535076f094b85ce3a2e0b4458f7',
    'fc51cd8e6218a1a38da47ed00230f0580816ed13ba3303ac5deb911548908025',
    'af82',
    '6291d657deec24024827e69c3abe01a30ce548a284743a445e3680d7db5ac3ac18ff9b538d16f290ae67f760984dc6594a7c15e9716ed28dc027beceea1ec40a',
  ],
];

test.each(VECTORS)('RFC 8032 §7.1: seed %s', async (seed, publicKey, message, signature) => {
  const pair = ticketKey(hex(seed).toString('base64url'));
  expect(rawPublicKey(pair.publicKey).toString('hex')).toBe(publicKey);
  expect(sign(null, hex(message), pair.privateKey).toString('hex')).toBe(signature);
  expect(verify(null, hex(message), pair.publicKey, hex(signature))).toBe(true);
  // Two more implementations: one in JavaScript, and the one that browsers have.
  expect(Buffer.from(ed25519.getPublicKey(hex(seed))).toString('hex')).toBe(publicKey);
  expect(ed25519.verify(hex(signature), hex(message), hex(publicKey))).toBe(true);
  const key = await webcrypto.subtle.importKey('raw', hex(publicKey), 'Ed25519', false, ['verify']);
  expect(await webcrypto.subtle.verify('Ed25519', key, hex(signature), hex(message))).toBe(true);
});

test('a public key is enough to verify', () => {
  const pair = ticketKey(hex(VECTORS[0]?.[0] ?? '').toString('base64url'));
  const jwk = { kty: 'OKP', crv: 'Ed25519', x: rawPublicKey(pair.publicKey).toString('base64url') };
  const publicOnly = createPublicKey({ key: jwk, format: 'jwk' });
  expect(verify(null, Buffer.from('x'), publicOnly, sign(null, Buffer.from('x'), pair.privateKey))).toBe(
    true,
  );
});
