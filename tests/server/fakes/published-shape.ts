import { readFileSync } from 'node:fs';

/**
 * Checks JSON against the object shapes that Stripe publishes: the declaration files of its own SDK, which Stripe
 * generates from its OpenAPI description of the API. Reads field names, which may be missing, and their types.
 */
const root = new URL('../../../node_modules/stripe/esm/resources/', import.meta.url);

type Field = { type: string; optional: boolean };
type Shapes = Map<string, { fields: Map<string, Field>; alias?: string }>;

const sources: Record<string, string> = {
  Session: 'Checkout/Sessions.d.ts',
  PaymentIntent: 'PaymentIntents.d.ts',
  Charge: 'Charges.d.ts',
  Refund: 'Refunds.d.ts',
  LineItem: 'LineItems.d.ts',
  Price: 'Prices.d.ts',
  BalanceTransaction: 'BalanceTransactions.d.ts',
  EventBase: 'Events.d.ts',
};

function readShapes(file: string): Shapes {
  const text = readFileSync(new URL(file, root), 'utf8').replace(/\/\*\*[\s\S]*?\*\//g, '');
  const shapes: Shapes = new Map();
  const stack: { kind: 'namespace' | 'interface' | 'other'; name: string }[] = [];
  const path = (name: string) =>
    [...stack.filter(({ kind }) => kind === 'namespace').map((entry) => entry.name), name].join('.');
  for (const raw of text.split('\n')) {
    const line = raw.trim();
    const opens = /^(?:export )?(?:declare )?(namespace|interface) (\w+)(?: extends [^{]+)? \{$/.exec(line);
    const alias = /^(?:export )?type (\w+) = (.+);$/.exec(line);
    const top = stack.at(-1);
    if (opens) {
      const [, kind, name = ''] = opens;
      if (kind === 'interface') shapes.set(path(name), { fields: new Map() });
      stack.push({ kind: kind as 'namespace' | 'interface', name: kind === 'interface' ? path(name) : name });
    } else if (alias) shapes.set(path(alias[1] ?? ''), { fields: new Map(), alias: alias[2] ?? '' });
    else if (line.endsWith('{')) stack.push({ kind: 'other', name: '' });
    else if (/^\}/.test(line)) stack.pop();
    else if (top?.kind === 'interface') {
      const field = /^(\w+)(\?)?: (.+);$/.exec(line);
      if (field)
        shapes
          .get(top.name)
          ?.fields.set(field[1] ?? '', { type: field[3] ?? '', optional: field[2] === '?' });
    }
  }
  return shapes;
}

/** The innermost name that a reference means, seen from the interface that uses it. */
function resolve(shapes: Shapes, from: string, name: string): string | null {
  const scope = from.split('.');
  for (let depth = scope.length; depth >= 0; depth -= 1) {
    const full = [...scope.slice(0, depth), name].join('.');
    if (shapes.has(full)) return full;
  }
  return null;
}

// Not looked into: another file's object, or a map of names to values.
const opaque = 'not looked into';

function fits(shapes: Shapes, from: string, type: string, value: unknown, at: string): string[] {
  const options = type.split(' | ').map((option) => option.trim());
  const problems: string[] = [];
  for (const option of options) {
    const list = /^Array<(.+)>$/.exec(option);
    if (option === 'null' && value === null) return [];
    if (option === typeof value) return [];
    if (/^'.*'$/.test(option) && value === option.slice(1, -1)) return [];
    if (option === 'OtherString' || option === "'" || option === 'null') continue;
    if (list && Array.isArray(value)) {
      const inside = value.flatMap((item, i) => fits(shapes, from, list[1] ?? '', item, `${at}[${i}]`));
      if (inside.length === 0) return [];
      problems.push(...inside);
      continue;
    }
    const name = /^[\w.]+$/.test(option) ? resolve(shapes, from, option) : null;
    const shape = name ? shapes.get(name) : undefined;
    if (name && shape?.alias) {
      if (fits(shapes, name, shape.alias, value, at).length === 0) return [];
    } else if (name && typeof value === 'object' && value !== null && !Array.isArray(value)) {
      const inside = check(shapes, name, value as Record<string, unknown>, at);
      if (inside.length === 0) return [];
      problems.push(...inside);
    } else if (!name && /^[A-Z]/.test(option) && typeof value === 'object' && value !== null) return [];
    else if (option === 'Decimal' && typeof value === 'string') return [];
  }
  return problems.length > 0 ? problems : [`${at}: ${JSON.stringify(value)} is not ${type.slice(0, 120)}`];
}

function check(shapes: Shapes, name: string, value: Record<string, unknown>, at: string): string[] {
  const fields = shapes.get(name)?.fields ?? new Map<string, Field>();
  // An event's payload is declared empty here; the caller checks it as the object that it is.
  if (fields.size === 0) return [];
  const missing = [...fields]
    .filter(([field, { optional }]) => !optional && value[field] === undefined)
    .map(([field]) => `${at}.${field}: missing`);
  const unknown = Object.keys(value)
    .filter((field) => !fields.has(field))
    .map((field) => `${at}.${field}: not in the published shape`);
  const wrong = Object.entries(value).flatMap(([field, inner]) => {
    const known = fields.get(field);
    return known ? fits(shapes, name, known.type, inner, `${at}.${field}`) : [];
  });
  return [...missing, ...unknown, ...wrong];
}

/** Every way in which `value` departs from the published shape; empty when it fits. */
export function publishedProblems(name: keyof typeof sources, value: object): string[] {
  const shapes = readShapes(sources[name] ?? '');
  const full = [...shapes.keys()].find((key) => key === name || key === `Checkout.${name}`);
  if (!full || (shapes.get(full)?.fields.size ?? 0) < 8)
    throw new Error(`${String(name)} was not found in ${sources[name]} (${opaque})`);
  return check(shapes, full, value as Record<string, unknown>, String(name));
}

/** Names that must be there, for a test that this reader reads at all. */
export function requiredFields(name: keyof typeof sources): string[] {
  const shapes = readShapes(sources[name] ?? '');
  const full = [...shapes.keys()].find((key) => key === name || key === `Checkout.${name}`) ?? '';
  return [...(shapes.get(full)?.fields ?? [])]
    .filter(([, { optional }]) => !optional)
    .map(([field]) => field);
}
