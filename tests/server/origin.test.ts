import { describe, expect, test, vi } from 'vitest';
import { z } from 'zod';
import { ok } from '@/lib/domain/shared/result';
import { action } from '@/lib/server/action';
import { fromOwnOrigin } from '@/lib/server/origin';
import { route } from '@/lib/server/route';
import { fakeRequest, useFakeRequest } from '../setup/fake-request';
import { runAction } from '../setup/run-action';
import { useTestDatabase } from '../setup/test-database';

vi.mock('next/headers', async () => (await import('../setup/fake-request')).nextHeaders);

// ASVS 5.0, 3.5.1 and 3.5.3. Next lets a server action without Origin run, and one whose wrong Origin agrees with a
// forged Host or X-Forwarded-Host; so each case is tried on the ladder that actions and routes share.
useTestDatabase();
useFakeRequest();
const OWN = 'http://localhost:3000';
const EVIL = 'https://evil.example';

const REFUSED: [string, Record<string, string>][] = [
  ['no origin', {}],
  ['a null origin', { origin: 'null' }],
  ['an empty origin', { origin: '' }],
  ['another origin', { origin: EVIL }],
  ['another origin with its own Host', { origin: EVIL, host: 'evil.example' }],
  ['another origin with its own X-Forwarded-Host', { origin: EVIL, 'x-forwarded-host': 'evil.example' }],
  ['another origin with a forged Forwarded', { origin: EVIL, forwarded: 'host=evil.example;proto=https' }],
  ['our host, another scheme', { origin: 'https://localhost:3000' }],
  ['our host, another port', { origin: 'http://localhost:3001' }],
  ['a host that begins like ours', { origin: 'http://localhost:3000.evil.example' }],
  ['ours with a path', { origin: `${OWN}/` }],
  ['ours, said to come from another site', { origin: OWN, 'sec-fetch-site': 'cross-site' }],
  ['ours, said to come from a sister site', { origin: OWN, 'sec-fetch-site': 'same-site' }],
  ['no origin, said to be typed in', { 'sec-fetch-site': 'none' }],
  ['no origin, said to be our own page', { 'sec-fetch-site': 'same-origin' }],
  ['a referer alone', { referer: `${OWN}/my` }],
];
const TAKEN: [string, Record<string, string>][] = [
  ['our origin', { origin: OWN }],
  ['our origin from our own page', { origin: OWN, 'sec-fetch-site': 'same-origin' }],
  ['our origin behind a proxy that names another host', { origin: OWN, host: '10.0.0.3:3000' }],
];

const ran = vi.fn();
const run = () => {
  ran();
  return ok(null);
};
const open = action({ schema: z.object({}), permission: 'public.read', run });
const post = route({
  schema: z.object({}),
  permission: 'public.read',
  run: () => {
    ran();
    return ok(new Response('done'));
  },
});
const call = (method: string, headers: Record<string, string>) =>
  post(new Request(`${OWN}/api/x`, { method, headers }), { params: Promise.resolve({}) });

describe.each(REFUSED)('%s', (_name, headers) => {
  test('runs no action', async () => {
    ran.mockClear();
    fakeRequest.headers = new Headers(headers);
    expect(fromOwnOrigin(fakeRequest.headers)).toBe(false);
    expect((await runAction(open, {})).sentence).toMatch(/did not come from our own pages/);
    expect(ran).not.toHaveBeenCalled();
  });

  test.each(['POST', 'PUT', 'PATCH', 'DELETE'])('runs no route by %s', async (method) => {
    ran.mockClear();
    const answer = await call(method, headers);
    expect(answer.status).toBe(403);
    expect(await answer.json()).toMatchObject({ type: 'urn:combwood:problem:wrong_origin', status: 403 });
    expect(ran).not.toHaveBeenCalled();
  });
});

describe.each(TAKEN)('%s', (_name, headers) => {
  test('runs', async () => {
    ran.mockClear();
    fakeRequest.headers = new Headers(headers);
    expect((await runAction(open, {})).state?.status).toBe('success');
    expect((await call('POST', headers)).status).toBe(200);
    expect(ran).toHaveBeenCalledTimes(2);
  });
});

test('reading needs no origin', async () => {
  expect((await call('GET', {})).status).toBe(200);
});
