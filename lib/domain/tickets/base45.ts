const ALPHABET = '0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZ $%*+-./:';

/** RFC 9285: two bytes become three characters of a QR code's alphanumeric mode, a last single byte two. */
export function encodeBase45(bytes: Uint8Array): string {
  let text = '';
  for (let at = 0; at < bytes.length; at += 2) {
    const pair = at + 1 < bytes.length;
    let rest = pair ? (bytes[at] ?? 0) * 256 + (bytes[at + 1] ?? 0) : (bytes[at] ?? 0);
    for (let digit = 0; digit < (pair ? 3 : 2); digit += 1) {
      text += ALPHABET[rest % 45];
      rest = Math.floor(rest / 45);
    }
  }
  return text;
}

/** Null for any text that the encoder could not have written: strange characters, a cut group, a value past its bytes. */
export function decodeBase45(text: string): Uint8Array<ArrayBuffer> | null {
  if (text.length % 3 === 1) return null;
  const bytes: number[] = [];
  for (let at = 0; at < text.length; at += 3) {
    const group = [...text.slice(at, at + 3)].map((character) => ALPHABET.indexOf(character));
    if (group.includes(-1)) return null;
    const value = group.reduceRight((sum, digit) => sum * 45 + digit, 0);
    if (value >= (group.length === 3 ? 65_536 : 256)) return null;
    if (group.length === 3) bytes.push(value >> 8);
    bytes.push(value & 255);
  }
  return Uint8Array.from(bytes);
}
