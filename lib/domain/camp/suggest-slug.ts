/** Letters that no accent can be taken off. */
const SPELLED: Record<string, string> = {
  ß: 'ss',
  æ: 'ae',
  ø: 'o',
  œ: 'oe',
  ð: 'd',
  þ: 'th',
  ł: 'l',
  đ: 'd',
  ı: 'i',
};

/** `Kettle Lake Härp Week` → `kettle-lake-harp-week`; `fallback` where no Latin letter or digit is left. At most 50. */
export function suggestSlug(name: string, fallback: string): string {
  const plain = name
    .toLowerCase()
    .replace(/[ßæøœðþłđı]/g, (letter) => SPELLED[letter] ?? '')
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .replace(/[’']/g, '')
    .replace(/[^a-z0-9]+/g, '-')
    .slice(0, 50)
    .replace(/^-+|-+$/g, '');
  return plain.length >= 3 ? plain : fallback;
}
