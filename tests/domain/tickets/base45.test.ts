import { Buffer } from 'node:buffer';
import base45 from 'base45';
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { decodeBase45, encodeBase45 } from '@/lib/domain/tickets/base45';

const bytes = (text: string) => new TextEncoder().encode(text);

// RFC 9285, sections 4.3 and 4.4.
test.each([
  ['AB', 'BB8'],
  ['Hello!!', '%69 VD92EX0'],
  ['base-45', 'UJCLQE7W581'],
  ['ietf!', 'QED8WEX0'],
])('RFC 9285: %s is %s', (plain, coded) => {
  expect(encodeBase45(bytes(plain))).toBe(coded);
  expect(decodeBase45(coded)).toEqual(bytes(plain));
});

// RFC 9285, section 6: FGW is 65535, GGW would be 65536 and must be refused; ":::" is past it too.
test.each(['GGW', ':::', '::', 'A', 'BB8A', 'bb8', 'BB_', 'ÄB8', 'BB8\n'])('refuses %j', (text) => {
  expect(decodeBase45(text)).toBeNull();
});
test('the largest group is read', () => {
  expect(decodeBase45('FGW')).toEqual(Uint8Array.from([255, 255]));
});

test('agrees with another implementation, and comes back as it went', () => {
  fc.assert(
    fc.property(fc.uint8Array({ maxLength: 200 }), (data) => {
      const text = encodeBase45(data);
      expect(text).toBe(base45.encode(Buffer.from(data)));
      expect(decodeBase45(text)).toEqual(data);
    }),
  );
});

test('one text only for each value: whatever decodes is what the encoder writes', () => {
  const text = fc.string({
    unit: fc.constantFrom(...'0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZ $%*+-./:'),
    maxLength: 30,
  });
  fc.assert(
    fc.property(text, (given) => {
      const read = decodeBase45(given);
      if (read) expect(encodeBase45(read)).toBe(given);
    }),
  );
});
