import 'server-only';
import { inflateSync } from 'node:zlib';

/**
 * WOFF 1.0 (W3C) to the font inside it. The PDF writer inflates a table anew for each glyph it looks at, which takes
 * seconds with a face of this size.
 */
export function unwrapWoff(woff: Buffer): Buffer {
  const tables = woff.readUInt16BE(12);
  const power = Math.floor(Math.log2(tables));
  const head = Buffer.alloc(12 + 16 * tables);
  woff.copy(head, 0, 4, 8);
  head.writeUInt16BE(tables, 4);
  head.writeUInt16BE(16 * 2 ** power, 6);
  head.writeUInt16BE(power, 8);
  head.writeUInt16BE(16 * (tables - 2 ** power), 10);
  const parts: Buffer[] = [head];
  let offset = head.length;
  for (let index = 0; index < tables; index += 1) {
    const entry = 44 + 20 * index;
    const to = 12 + 16 * index;
    const [from, packed, length] = [4, 8, 12].map((at) => woff.readUInt32BE(entry + at)) as [
      number,
      number,
      number,
    ];
    const raw = woff.subarray(from, from + packed);
    const data = packed < length ? inflateSync(raw) : raw;
    woff.copy(head, to, entry, entry + 4);
    woff.copy(head, to + 4, entry + 16, entry + 20);
    head.writeUInt32BE(offset, to + 8);
    head.writeUInt32BE(length, to + 12);
    const padding = Buffer.alloc((4 - (length % 4)) % 4);
    parts.push(data, padding);
    offset += length + padding.length;
  }
  return Buffer.concat(parts);
}
