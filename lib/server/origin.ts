import 'server-only';
import { env } from './env';

/**
 * Did our own page send this? Compared with the configured host only: Host and X-Forwarded-Host are the client's to
 * forge, and Next lets an action without an Origin run. Browsers send Origin with every POST; its absence is refused.
 */
export function fromOwnOrigin(headers: Headers): boolean {
  const site = headers.get('sec-fetch-site');
  if (site !== null && site !== 'same-origin') return false;
  return headers.get('origin') === new URL(env().BASE_URL).origin;
}
