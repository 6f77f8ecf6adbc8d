const OWN = 'http://own.invalid';

/** Browsers drop controls before they read an address and take `\` for `/`. */
const misread = (text: string): boolean =>
  [...text].some((sign) => sign < ' ' || sign === '\u007f' || sign === '\\');

/**
 * A path of our own to go on to, or null. Refuses what a browser would take for another host: `//evil`, `/\evil`,
 * `https:evil`, `/.//evil`, which resolves to `//evil` (ASVS 3.7.2; WHATWG URL, basic parser).
 */
export function safeNext(next: string | null | undefined): string | null {
  if (!next || next.length > 500 || !next.startsWith('/') || misread(next)) return null;
  if (!URL.canParse(next, OWN)) return null;
  const url = new URL(next, OWN);
  if (url.origin !== OWN || url.pathname.startsWith('//')) return null;
  return url.pathname + url.search + url.hash;
}
