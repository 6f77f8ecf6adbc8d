import 'server-only';
import type { Refusal } from './errors';

/**
 * More than any form of ours sends (a workshop with 24 harps of 12 alternatives), and little enough to read at once.
 * Reading is quadratic in values of one name and makes every list as long as its highest index: `x[10000000]`, one
 * field, held the server for 16 seconds and 20,000 of one name for 25, before anybody had to sign in.
 */
const MOST = { fields: 3000, alike: 600, name: 200, depth: 8, index: 999, text: 1_000_000 } as const;

const ODD: Refusal = {
  code: 'bad_input',
  sentence: 'The form came in a shape that no page of ours sends. Load the page again and retry.',
};
const LONG: Refusal = {
  code: 'too_large',
  sentence: 'The form has more than a million characters of text. Shorten it and send it again.',
};

/** Looks at names and lengths only, before the form is read. Null when it may be read. */
export function refuseFormShape(form: FormData): Refusal | null {
  const seen = new Map<string, number>();
  let fields = 0;
  let text = 0;
  for (const [name, value] of form.entries()) {
    fields += 1;
    const alike = (seen.get(name) ?? 0) + 1;
    seen.set(name, alike);
    if (fields > MOST.fields || alike > MOST.alike || !isPath(name)) return ODD;
    if (typeof value !== 'string') continue;
    text += value.length;
    if (text > MOST.text) return LONG;
    if (name === '__intent__' && !isIntent(value)) return ODD;
  }
  return null;
}

function isPath(name: string): boolean {
  if (name.length > MOST.name || name.split(/[.[]/).length > MOST.depth) return false;
  return [...name.matchAll(/\[(\d+)\]/g)].every(([, index]) => Number(index) <= MOST.index);
}

/** A button of the form itself, such as "Add another harp", names a list and a place in it. */
function isIntent(value: string): boolean {
  try {
    const { type, payload = {} } = JSON.parse(value) as { type?: unknown; payload?: Record<string, unknown> };
    const { name = '', index = 0, from = 0, to = 0 } = payload;
    const inList = [index, from, to].every(
      (at) => Number.isInteger(at) && Number(at) >= 0 && Number(at) <= MOST.index,
    );
    return typeof type === 'string' && typeof name === 'string' && isPath(name) && inList;
  } catch {
    return false;
  }
}
