import type { MetadataRoute } from 'next';
import { env } from '@/lib/server/env';

export const dynamic = 'force-dynamic';

/** What is personal is guarded by permission, not by this file; it only spares crawlers the dead ends. */
export default function robots(): MetadataRoute.Robots {
  return {
    rules: {
      userAgent: '*',
      allow: '/',
      disallow: [
        '/api/',
        '/account',
        '/my',
        '/o/',
        '/organise',
        '/door',
        '/invitations/',
        '/verify',
        '/reset',
      ],
    },
    sitemap: `${env().BASE_URL}/sitemap.xml`,
  };
}
