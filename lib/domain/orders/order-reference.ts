/** Without 0/O, 1/I/L and vowels: nothing to mishear on the phone, and no words by accident. 28 letters, 8 of them. */
const LETTERS = '23456789BCDFGHJKMNPQRSTVWXYZ';
const LENGTH = 8;

/** A reference from random bytes, read left to right; a byte over the last whole multiple of 28 is skipped. Null when they run out. */
export function orderReference(bytes: Uint8Array): string | null {
  const most = 256 - (256 % LETTERS.length);
  let text = '';
  for (const byte of bytes) {
    if (byte < most) text += LETTERS[byte % LETTERS.length];
    if (text.length === LENGTH) return text;
  }
  return null;
}
