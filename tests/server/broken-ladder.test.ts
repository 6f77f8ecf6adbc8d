import { expect, test, vi } from 'vitest';
import { z } from 'zod';
import { ok } from '@/lib/domain/shared/result';
import { action } from '@/lib/server/action';
import { route } from '@/lib/server/route';
import { useFakeRequest } from '../setup/fake-request';

vi.mock('next/headers', async () => (await import('../setup/fake-request')).nextHeaders);
vi.mock('@/lib/server/auth/get-actor', () => ({
  getActor: async () => {
    throw new Error('database or disk is full');
  },
}));
useFakeRequest();

test('a database that fails before anything runs is a clean 500 of a route, with a reference', async () => {
  const get = route({ schema: z.object({}), permission: 'public.read', run: () => ok(new Response('')) });
  const answer = await get(new Request('http://localhost:3000/api/x'), { params: Promise.resolve({}) });
  expect(answer.status).toBe(500);
  expect(answer.headers.get('content-type')).toBe('application/problem+json');
  const text = await answer.text();
  expect(text).toMatch(/with the reference [0-9a-f]{8}/);
  expect(text).not.toContain('disk');
});

test('and a form says so, with what was typed still in it', async () => {
  const save = action({
    schema: z.object({ name: z.string() }),
    permission: 'public.read',
    run: () => ok(null),
  });
  const form = new FormData();
  form.set('name', 'Łucja');
  const state = await save(null, form);
  expect(state?.initialValue).toEqual({ name: 'Łucja' });
  expect(String(state?.error?.[''])).toMatch(/Something went wrong on our side.*reference [0-9a-f]{8}/);
});
