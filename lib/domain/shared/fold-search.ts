// Letters that Unicode does not take apart into base and accent.
const WHOLE: Record<string, string> = {
  ł: 'l',
  ø: 'o',
  đ: 'd',
  ð: 'd',
  þ: 'th',
  ß: 'ss',
  æ: 'ae',
  œ: 'oe',
  ı: 'i',
};

/** A name as search compares it: lower case, no accents, single spaces. "Łukasz Ångström" → "lukasz angstrom". */
export const foldSearch = (text: string): string =>
  text
    .toLowerCase()
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .replace(/[łøđðþßæœı]/g, (letter) => WHOLE[letter] ?? letter)
    .replace(/\s+/g, ' ')
    .trim();
