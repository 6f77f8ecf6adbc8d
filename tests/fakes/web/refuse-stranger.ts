import type { IncomingMessage } from 'node:http';

const loopback = new Set(['localhost', '127.0.0.1', '[::1]']);

/**
 * A page somewhere on the web can make this machine's browser call a loopback port. Two rules keep it out: the Host
 * must be a loopback name (stops DNS rebinding) and a write must not come from another origin.
 * Returns why the request is refused, or null.
 */
export function refuseStranger(req: IncomingMessage): string | null {
  const host = req.headers.host ?? '';
  if (!loopback.has(host.replace(/:\d+$/, '')))
    return `Host “${host}” is not this machine; use 127.0.0.1 or localhost.`;
  if (req.method === 'GET' || req.method === 'HEAD') return null;
  const site = req.headers['sec-fetch-site'];
  if (site !== undefined && site !== 'same-origin' && site !== 'none')
    return 'A page of another site may not post here.';
  const origin = req.headers.origin;
  if (origin !== undefined && origin !== `http://${host}`) return `Origin “${origin}” may not post here.`;
  return null;
}
