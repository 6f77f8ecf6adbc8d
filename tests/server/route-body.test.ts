import { expect, test, vi } from 'vitest';
import { z } from 'zod';
import { ok } from '@/lib/domain/shared/result';
import { route } from '@/lib/server/route';
import { fakeRequest, useFakeRequest } from '../setup/fake-request';
import { useTestDatabase } from '../setup/test-database';

vi.mock('next/headers', async () => (await import('../setup/fake-request')).nextHeaders);
useTestDatabase();
useFakeRequest();

const POST = route({
  schema: z.object({ body: z.object({ text: z.string() }) }),
  permission: 'public.read',
  limit: 1000,
  run: ({ body }) => ok(Response.json(body)),
});

const send = (body: BodyInit) =>
  POST(
    new Request('http://localhost:3000/api/x', {
      method: 'POST',
      headers: fakeRequest.headers,
      body,
      duplex: 'half',
    } as RequestInit),
    { params: Promise.resolve({}) },
  );

test('a body without an end is read no further than its limit (ASVS 5.2.1)', async () => {
  let given = 0;
  const endless = new ReadableStream<Uint8Array>({
    pull(controller) {
      given += 1;
      if (given > 1000) controller.close();
      else controller.enqueue(new Uint8Array(500));
    },
  });
  const answer = await send(endless);
  expect(answer.status).toBe(413);
  expect(answer.headers.get('content-type')).toBe('application/problem+json');
  expect(await answer.json()).toMatchObject({ status: 413, detail: expect.stringContaining('1000 bytes') });
  expect(given).toBeLessThan(10);
});

test('a body within the limit is taken; one that is no JSON is refused by field', async () => {
  expect(await (await send('{"text":"Łucja"}')).json()).toEqual({ text: 'Łucja' });
  const odd = await send('{"text":');
  expect(odd.status).toBe(400);
  expect(await odd.json()).toMatchObject({ errors: { body: ['The body is not JSON.'] } });
});
