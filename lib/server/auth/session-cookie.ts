import 'server-only';
import { cookies } from 'next/headers';
import { env } from '../env';
import { ABSOLUTE_MS } from './session-limits';

type CookieFlags = { httpOnly: true; sameSite: 'lax'; secure: boolean; path: '/' };

const overHttps = (): boolean => env().BASE_URL.startsWith('https:');

/**
 * Over https the name starts with `__Host-`: a browser then takes the cookie only from this very host, over TLS and
 * without a Domain, so a neighbouring subdomain cannot plant one (ASVS 3.3.1, 3.3.3). Plain http is localhost only.
 */
export const cookieName = (base: string): string => (overHttps() ? `__Host-${base}` : base);

/** No script reads it, no other site's form sends it, no plain connection carries it. */
export const cookieFlags = (): CookieFlags => ({
  httpOnly: true,
  sameSite: 'lax',
  secure: overHttps(),
  path: '/',
});

export const sessionCookieName = (): string => cookieName('combwood_session');

/** Only in an action or a route handler: Next refuses to write cookies while a page renders. */
export async function setSessionCookie(token: string): Promise<void> {
  // It lives as long as the session may at most; the idle limit is the database's, where nobody can edit it.
  (await cookies()).set(sessionCookieName(), token, { ...cookieFlags(), maxAge: ABSOLUTE_MS / 1000 });
}

export async function clearSessionCookie(): Promise<void> {
  (await cookies()).set(sessionCookieName(), '', { ...cookieFlags(), maxAge: 0 });
}
