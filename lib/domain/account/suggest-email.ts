const ENDINGS: Record<string, string> = {
  con: 'com',
  cmo: 'com',
  ocm: 'com',
  vom: 'com',
  xom: 'com',
  cim: 'com',
  comm: 'com',
  coom: 'com',
  ogr: 'org',
  orgg: 'org',
  rog: 'org',
  nte: 'net',
  ney: 'net',
  nett: 'net',
};

/**
 * The address that was likely meant, or null: a mistyped ending, or a domain one slip away from one in `common` (domains
 * that many accounts have). A warning only: strange domains exist.
 */
export function suggestEmail(email: string, common: readonly string[]): string | null {
  const at = email.lastIndexOf('@');
  const domain = email.slice(at + 1);
  if (at < 1 || common.includes(domain)) return null;
  const near = common.find((known) => known.length > 5 && isOneSlip(domain, known));
  const dot = domain.lastIndexOf('.');
  const ending = ENDINGS[domain.slice(dot + 1)];
  const meant = near ?? (ending ? `${domain.slice(0, dot + 1)}${ending}` : null);
  return meant ? `${email.slice(0, at + 1)}${meant}` : null;
}

/** One sign left out, put in, changed, or two swapped (Damerau). */
function isOneSlip(typed: string, meant: string): boolean {
  if (typed === meant || Math.abs(typed.length - meant.length) > 1) return false;
  let from = 0;
  while (from < typed.length && typed[from] === meant[from]) from += 1;
  const [a, b] = [typed.slice(from), meant.slice(from)];
  const swapped = a[0] === b[1] && a[1] === b[0] && a.slice(2) === b.slice(2);
  return swapped || a.slice(1) === b || a === b.slice(1) || a.slice(1) === b.slice(1);
}
