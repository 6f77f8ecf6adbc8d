/** @type {import('next').NextConfig} */
const config = {
  reactStrictMode: true,
  poweredByHeader: false,
  typedRoutes: true,
  // Pictures are re-encoded to WebP at upload and served by our own route, so Next's optimiser stays off (image advisories of 2026).
  images: { unoptimized: true },
  serverExternalPackages: [
    'better-sqlite3',
    'stripe',
    'nodemailer',
    'qrcode',
    'pino',
    'sharp',
    '@node-rs/argon2',
    '@react-pdf/renderer',
    '@react-email/components',
    '@react-email/render',
    'rate-limiter-flexible',
  ],
  // The content security policy needs a nonce a request and comes from proxy.ts; these are the same for every answer.
  async headers() {
    return [
      {
        source: '/:path*',
        headers: [
          { key: 'x-content-type-options', value: 'nosniff' },
          { key: 'referrer-policy', value: 'strict-origin-when-cross-origin' },
          { key: 'x-frame-options', value: 'DENY' },
          { key: 'cross-origin-opener-policy', value: 'same-origin' },
          {
            key: 'permissions-policy',
            value: 'camera=(self), microphone=(self), geolocation=(), payment=()',
          },
          // Ignored by browsers over plain http, so the demo on localhost is untouched.
          { key: 'strict-transport-security', value: 'max-age=31536000; includeSubDomains' },
        ],
      },
      // Pages seen while signed in leave the browser's cache with the session (ASVS 14.3.1). Not "storage": a door
      // phone's unsent scans lie there, and any other site could lead a browser to this address.
      { source: '/signed-out', headers: [{ key: 'clear-site-data', value: '"cache"' }] },
    ];
  },
  experimental: { authInterrupts: true, serverActions: { bodySizeLimit: '12mb' } },
};

export default config;
