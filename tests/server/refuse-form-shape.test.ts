import { describe, expect, test, vi } from 'vitest';
import { z } from 'zod';
import { ok } from '@/lib/domain/shared/result';
import { action } from '@/lib/server/action';
import { refuseFormShape } from '@/lib/server/refuse-form-shape';
import { useFakeRequest } from '../setup/fake-request';
import { useTestDatabase } from '../setup/test-database';

vi.mock('next/headers', async () => (await import('../setup/fake-request')).nextHeaders);
useTestDatabase();
useFakeRequest();

// Milliseconds; the first of these held the server for 16 s, the busiest for 25 s.
const AT_ONCE = 2000;

const formOf = (fields: readonly (readonly [string, string])[]): FormData => {
  const form = new FormData();
  for (const [name, value] of fields) form.append(name, value);
  return form;
};
const intent = (payload: object) => ['__intent__', JSON.stringify({ type: 'insert', payload })] as const;

// ASVS 5.0, 2.2.2 and 15.2.2: posts that skip the client, made to keep the server busy.
const ODD = [
  ['an index of ten millions', [['harps[10000000]', 'x']]],
  ['an index in a name nobody asks for', [['junk[1000]', 'x']]],
  ['a path of 20,000 steps', [[`a${'.b'.repeat(20_000)}`, 'x']]],
  ['20,000 values of one name', Array.from({ length: 20_000 }, () => ['electives', 'x'] as const)],
  ['an intent that is no JSON', [['__intent__', '{{{']]],
  ['an intent at an index of ten millions', [intent({ name: 'needs', index: 10_000_000 })]],
  ['an intent on a path with such an index', [intent({ name: 'needs[10000000]' })]],
] as const satisfies readonly (readonly [string, readonly (readonly [string, string])[]])[];

const saved = vi.fn(() => ok(null));
const save = action({
  schema: z.object({ name: z.string(), harps: z.array(z.string()).default([]) }),
  permission: 'public.read',
  run: saved,
});

describe.each(ODD)('a form with %s', (_, fields) => {
  test('is refused before it is read, at once', async () => {
    const began = performance.now();
    const state = await save(null, formOf([['name', 'Noor'], ...fields]));
    expect(performance.now() - began).toBeLessThan(AT_ONCE);
    expect(state?.status).toBe('error');
    expect(String(state?.error?.[''])).toMatch(/shape that no page of ours sends/);
    expect(saved).not.toHaveBeenCalled();
  });
});

test('text is taken up to a million characters', () => {
  expect(refuseFormShape(formOf([['about', 'x'.repeat(1_000_000)]]))).toBeNull();
  expect(refuseFormShape(formOf([['about', 'x'.repeat(1_000_001)]]))?.code).toBe('too_large');
});

test('the largest form of ours passes, and is read at once', async () => {
  const fields: [string, string][] = [['name', 'Noor']];
  for (let need = 0; need < 24; need += 1)
    for (let ask = 0; ask < 12; ask += 1)
      for (const part of ['by', 'key', 'tuning', 'register', 'songKey', 'position'])
        fields.push([`needs[${need}].anyOf[${ask}].${part}`, 'x']);
  for (let harp = 0; harp < 400; harp += 1) fields.push(['harps', `h${harp}`]);
  const form = formOf([...fields, intent({ name: 'needs[3].anyOf', index: 2 })]);
  expect(refuseFormShape(form)).toBeNull();
  form.delete('__intent__');
  const began = performance.now();
  expect((await save(null, form))?.status).toBe('success');
  expect(performance.now() - began).toBeLessThan(AT_ONCE);
});
