import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { CampId, TicketId } from '@/lib/domain/shared/ids';
import { decodeBase45, encodeBase45 } from '@/lib/domain/tickets/base45';
import { joinTicket, parseTicket, ticketMessage, ticketPayload } from '@/lib/domain/tickets/ticket-token';

const tail = fc.string({
  unit: fc.constantFrom(...'0123456789abcdefghijklmnopqrstuvwxyz'),
  minLength: 1,
  maxLength: 40,
});
const claims = fc.record({
  campId: tail.map((text): CampId => `cmp_${text}`),
  ticketId: tail.map((text): TicketId => `tkt_${text}`),
  issuedAt: fc.integer({ min: 0, max: 2 ** 48 - 1 }),
});
const keyId = fc.uint8Array({ minLength: 4, maxLength: 4 });
const signature = fc.uint8Array({ minLength: 64, maxLength: 64 });

test('what is joined is read back, whatever the ids, leading zeros included', () => {
  fc.assert(
    fc.property(claims, keyId, signature, (given, key, signed) => {
      const payload = ticketPayload(key, given);
      const read = parseTicket(joinTicket(payload, signed));
      expect(read).toMatchObject(given);
      expect(read?.message).toEqual(ticketMessage(payload));
      expect(read?.signature).toEqual(signed);
    }),
  );
});

test('reading never throws, and reads nothing from noise', () => {
  fc.assert(
    fc.property(fc.oneof(fc.string(), fc.string({ unit: 'binary' })), (text) => {
      expect(parseTicket(text)).toBeNull();
    }),
  );
  fc.assert(
    fc.property(fc.uint8Array({ minLength: 80, maxLength: 150 }), (data) => {
      const text = encodeBase45(Uint8Array.from([1, ...data]));
      const read = parseTicket(text);
      // Only one text stands for one ticket: no byte may be ignored.
      if (read)
        expect(joinTicket(decodeBase45(text)?.slice(0, -64) ?? new Uint8Array(), read.signature)).toBe(text);
    }),
  );
});

test('cut short or run long, at every length, is no ticket', () => {
  const payload = ticketPayload(new Uint8Array(4), { campId: 'cmp_1', ticketId: 'tkt_1', issuedAt: 1 });
  const whole = Uint8Array.from([...payload, ...new Uint8Array(64)]);
  for (let length = 0; length < whole.length; length += 1)
    expect(parseTicket(encodeBase45(whole.slice(0, length)))).toBeNull();
  expect(parseTicket(encodeBase45(Uint8Array.from([...whole, 0])))).toBeNull();
  expect(parseTicket(encodeBase45(whole))).not.toBeNull();
});

test('an unknown version is no ticket', () => {
  const payload = ticketPayload(new Uint8Array(4), { campId: 'cmp_1', ticketId: 'tkt_1', issuedAt: 1 });
  payload[0] = 2;
  expect(parseTicket(joinTicket(payload, new Uint8Array(64)))).toBeNull();
});
