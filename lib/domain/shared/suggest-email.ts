// Slips of the last part that are not themselves endings in use. Common practice, from memory.
const ENDINGS: Record<string, string> = {
  con: 'com',
  cmo: 'com',
  ocm: 'com',
  comm: 'com',
  vom: 'com',
  xom: 'com',
  cpm: 'com',
  coom: 'com',
  c0m: 'com',
  nte: 'net',
  nett: 'net',
  met: 'net',
  ogr: 'org',
  orgg: 'org',
  rog: 'org',
  eud: 'edu',
  'co.ku': 'co.uk',
  'c.ouk': 'co.uk',
  'co.uj': 'co.uk',
};

/**
 * What an address was probably meant to be, or null where nothing looks off: a slip in the ending, a comma for the
 * dot, a doubled dot, `www.` in front. A hint to show, never a reason to refuse. Names of mail services are not
 * compared, so a slip in one of them goes by.
 */
export function suggestEmail(address: string): string | null {
  const at = address.lastIndexOf('@');
  if (at < 1) return null;
  const local = address.slice(0, at);
  let domain = address.slice(at + 1).toLowerCase();
  const before = domain;
  domain = domain
    .replace(/,/g, '.')
    .replace(/\.{2,}/g, '.')
    .replace(/^www\./, '');
  const two = domain.split('.').slice(-2).join('.');
  const one = domain.split('.').pop() ?? '';
  for (const ending of [two, one]) {
    const meant = ENDINGS[ending];
    if (meant) {
      domain = domain.slice(0, domain.length - ending.length) + meant;
      break;
    }
  }
  return domain === before ? null : `${local}@${domain}`;
}
