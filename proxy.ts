import { type NextRequest, NextResponse } from 'next/server';

/**
 * Response headers for pages only: no authorisation here. The nonce lets Next's own inline scripts run and nothing
 * else; `wasm-unsafe-eval` is for the ticket scanner's decoder, which comes from our own origin.
 */
export function proxy(request: NextRequest): NextResponse {
  const nonce = crypto.randomUUID().replaceAll('-', '');
  const dev = process.env.NODE_ENV === 'development';
  const policy = [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic' 'wasm-unsafe-eval'${dev ? " 'unsafe-eval'" : ''}`,
    "style-src 'self' 'unsafe-inline'",
    "img-src 'self' data: blob:",
    "font-src 'self'",
    `connect-src 'self'${dev ? ' ws:' : ''}`,
    "media-src 'self' blob:",
    "worker-src 'self' blob:",
    "object-src 'none'",
    "base-uri 'none'",
    "frame-ancestors 'none'",
    `form-action 'self' ${paymentOrigin()}`,
  ].join('; ');
  const headers = new Headers(request.headers);
  headers.set('x-nonce', nonce);
  headers.set('content-security-policy', policy);
  headers.set('x-combwood-path', request.nextUrl.pathname + request.nextUrl.search);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('content-security-policy', policy);
  return response;
}

/** Chromium applies `form-action` to the redirect that follows a form, and paying ends on the provider's page. */
const paymentOrigin = (): string =>
  process.env.STRIPE_API_URL ? new URL(process.env.STRIPE_API_URL).origin : 'https://checkout.stripe.com';

export const config = {
  matcher: [
    {
      // Not by the ending of a name: `/invitations/x.js` is a page like any other.
      source: '/((?!_next/static|_next/image|api/|favicon.ico|icon|fonts/).*)',
      missing: [{ type: 'header', key: 'next-router-prefetch' }],
    },
  ],
};
