import { type Id, type IdPrefix, isId } from '../shared/ids';

// Bytes that hold any number of so many base-36 digits.
const bytesFor = (digits: number): number => Math.ceil((digits * Math.log2(36)) / 8);

/** An id without its prefix: one byte of length, then its characters as one base-36 number (26 bytes become 18). */
export function packId(id: Id<IdPrefix>): number[] {
  const tail = id.slice(id.indexOf('_') + 1);
  let value = [...tail].reduce((sum, digit) => sum * 36n + BigInt(Number.parseInt(digit, 36)), 0n);
  const bytes: number[] = [];
  for (let left = bytesFor(tail.length); left > 0; left -= 1) {
    bytes.unshift(Number(value & 255n));
    value >>= 8n;
  }
  return [tail.length, ...bytes];
}

/** The id at `from` and where the next field starts; null unless `packId` wrote exactly these bytes. */
export function unpackId<P extends IdPrefix>(
  prefix: P,
  bytes: Uint8Array,
  from: number,
): { id: Id<P>; next: number } | null {
  const digits = bytes[from] ?? 0;
  const next = from + 1 + bytesFor(digits);
  if (digits === 0 || next > bytes.length) return null;
  let value = bytes.slice(from + 1, next).reduce((sum, byte) => (sum << 8n) | BigInt(byte), 0n);
  let tail = '';
  for (let left = digits; left > 0; left -= 1) {
    tail = Number(value % 36n).toString(36) + tail;
    value /= 36n;
  }
  const id = `${prefix}_${tail}`;
  return value === 0n && isId(prefix, id) ? { id, next } : null;
}
