import { beforeEach } from 'vitest';

type Set = { name: string; value: string; flags: Record<string, unknown> };

/**
 * Stands in for the request that Next hands to a server function. A test file says
 * `vi.mock('next/headers', async () => (await import('@/tests/setup/fake-request')).nextHeaders)` and likewise for
 * `next/server` and `next/cache`; `after` runs at once and can be waited for.
 */
export const fakeRequest = {
  headers: new Headers(),
  jar: new Map<string, string>(),
  /** Every cookie written, with its flags. */
  written: [] as Set[],
  pending: [] as Promise<unknown>[],
};

const cookies = {
  get: (name: string) => {
    const value = fakeRequest.jar.get(name);
    return value === undefined ? undefined : { name, value };
  },
  set: (name: string, value: string, flags: Record<string, unknown> = {}) => {
    fakeRequest.written.push({ name, value, flags });
    if (flags.maxAge === 0) fakeRequest.jar.delete(name);
    else fakeRequest.jar.set(name, value);
  },
  delete: (name: string) => cookies.set(name, '', { maxAge: 0 }),
};

export const nextHeaders = { headers: async () => fakeRequest.headers, cookies: async () => cookies };
export const nextServer = {
  after: (run: () => Promise<unknown>) => fakeRequest.pending.push(Promise.resolve().then(run)),
};
export const nextCache = { revalidatePath: () => undefined };

/** What was put off until the answer had left is done. */
export const settled = async (): Promise<void> => {
  await Promise.all(fakeRequest.pending.splice(0));
};

/** Another browser: own origin, given address, no cookies. */
export function newBrowser(
  address = '192.0.2.10',
  userAgent = 'Mozilla/5.0 (X11; Linux) Firefox/140.0',
): void {
  fakeRequest.jar = new Map();
  fakeRequest.written = [];
  fakeRequest.headers = new Headers({
    origin: 'http://localhost:3000',
    'sec-fetch-site': 'same-origin',
    'user-agent': userAgent,
    'x-combwood-peer': address,
  });
}

export const useFakeRequest = (): void => {
  beforeEach(() => newBrowser());
};
