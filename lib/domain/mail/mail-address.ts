/** One recipient; always as an object, because a text with a comma in it is read as two. */
export type MailAddress = { name: string; address: string };

// A header's line breaks, and what turns the reading direction of all that follows (ASVS 1.3.11).
const CONTROL = /[\p{Cc}\u2028\u2029\u202a-\u202e\u2066-\u2069]+/gu;
// Looser than what forms take, strict about what would mean something to a mail server.
const ADDRESS = /^[^\s@<>(),;:"[\]\\\p{Cc}]+@[^\s@<>(),;:"[\]\\\p{Cc}]+$/u;

/** A name or subject as one line that cannot start a header of its own. */
export const oneLine = (text: string): string => text.replace(CONTROL, ' ').replace(/\s+/g, ' ').trim();

/** Null where the address could be read as anything but one address. */
export function mailAddress(name: string, address: string): MailAddress | null {
  const plain = address.trim();
  return plain.length <= 254 && ADDRESS.test(plain) ? { name: oneLine(name), address: plain } : null;
}
