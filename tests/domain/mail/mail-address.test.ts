import fc from 'fast-check';
import { expect, test } from 'vitest';
import { mailAddress, oneLine } from '@/lib/domain/mail/mail-address';

// OWASP ASVS 5.0, 1.3.11: nothing of a name, subject or address starts a header or a second recipient.
test.each([
  'a@example.test, b@example.test',
  'a@example.test;b@example.test',
  'a@example.test\r\nBcc: b@example.test',
  'a@example.test\0',
  '<a@example.test>',
  '"a"@example.test',
  'a b@example.test',
  'a@b@example.test',
  'group:a@example.test',
  'example.test',
  '',
  `${'a'.repeat(250)}@example.test`,
])('refuses %j as one address', (address) => {
  expect(mailAddress('Noor', address)).toBeNull();
});

test.each(['noor@example.test', 'noor+camp@example.test', "o'neill@example.test", ' noor@example.test '])(
  'takes %j',
  (address) => {
    expect(mailAddress('Noor', address)).toEqual({ name: 'Noor', address: address.trim() });
  },
);

test('a name or subject is one line, and does not turn the text round', () => {
  expect(oneLine('Noor\r\nBcc: x@example.test')).toBe('Noor Bcc: x@example.test');
  expect(oneLine('a\u202egpj.exe')).toBe('a gpj.exe');
  fc.assert(
    fc.property(fc.string({ unit: 'binary' }), (text) => {
      expect(oneLine(text)).not.toMatch(/[\p{Cc}\u2028\u2029]/u);
    }),
  );
});
