import 'server-only';
import { createHash } from 'node:crypto';

/**
 * A 200 with a strong ETag, or a 304 without a body when the client already has this very text. Fresh for `seconds`;
 * the same for everybody, so shared caches may keep it.
 */
export function respondWithEtag(
  text: string,
  ifNoneMatch: string | null,
  type: string,
  seconds: number,
): Response {
  const etag = `"${createHash('sha256').update(text).digest('base64url').slice(0, 22)}"`;
  const headers = { etag, 'cache-control': `public, max-age=${seconds}` };
  const known = (ifNoneMatch ?? '').split(',').map((each) => each.trim().replace(/^W\//, ''));
  if (known.includes(etag) || known.includes('*')) return new Response(null, { status: 304, headers });
  return new Response(text, { headers: { ...headers, 'content-type': type } });
}
