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
    'rate-limiter-flexible',
  ],
  experimental: { authInterrupts: true, serverActions: { bodySizeLimit: '12mb' } },
};

export default config;
