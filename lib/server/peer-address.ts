import 'server-only';
import { AsyncLocalStorage } from 'node:async_hooks';
import { randomUUID } from 'node:crypto';
import http from 'node:http';
import { networkOf } from '@/lib/domain/shared/network-of';
import { env } from './env';

/** Set by us on every request before Next sees it; whatever a client sent under these names is dropped. */
const PEER_HEADER = 'x-combwood-peer';
const REQUEST_HEADER = 'x-combwood-request';

const marked = globalThis as typeof globalThis & {
  combwoodPeerMarked?: boolean;
  /** The answer to the request being worked on; components/ui/no-script-way.tsx reads its status. */
  combwoodAnswer?: AsyncLocalStorage<{ readonly statusCode: number }>;
};

/**
 * Route handlers see no socket, and Next passes a client's own X-Forwarded-For on, so rate limits by address could be
 * walked around (ASVS 4.1.3). This notes the socket's address, and a request id, on each request as it arrives.
 */
export function markRequests(): void {
  if (marked.combwoodPeerMarked) return;
  marked.combwoodPeerMarked = true;
  const answer = new AsyncLocalStorage<{ readonly statusCode: number }>();
  marked.combwoodAnswer = answer;
  const emit = http.Server.prototype.emit;
  http.Server.prototype.emit = function patched(this: http.Server, event: string, ...args: unknown[]) {
    const request = args[0];
    if (event === 'request' && request instanceof http.IncomingMessage) {
      request.headers[PEER_HEADER] = request.socket.remoteAddress ?? '';
      request.headers[REQUEST_HEADER] = randomUUID();
      if (args[1] instanceof http.ServerResponse)
        return answer.run(args[1], () => Reflect.apply(emit, this, [event, ...args]));
    }
    return Reflect.apply(emit, this, [event, ...args]);
  } as typeof emit;
}

/** The client's address: the socket's, or behind N trusted proxies the Nth entry from the right of X-Forwarded-For. IPv6 by network. */
export function clientAddress(headers: Headers): string {
  const hops = env().TRUSTED_PROXIES;
  if (hops > 0) {
    const chain = (headers.get('x-forwarded-for') ?? '').split(',').map((part) => part.trim());
    // Next adds the socket's own address only when the header is absent, so the list is the proxies' alone.
    const at = chain[chain.length - hops];
    if (at) return networkOf(at);
  }
  return networkOf(headers.get(PEER_HEADER) ?? 'unknown');
}

/** The id that this request's log lines carry; also shown to a person when something breaks. */
export const requestId = (headers: Headers): string => headers.get(REQUEST_HEADER) ?? randomUUID();
