import type { MetadataRoute } from 'next';
import { listPublicCamps } from '@/lib/server/camps/list-public-camps';
import { env } from '@/lib/server/env';

export const dynamic = 'force-dynamic';

const ABOUT = ['cautions', 'accessibility', 'privacy'];

export default function sitemap(): MetadataRoute.Sitemap {
  const base = env().BASE_URL;
  const { coming, past } = listPublicCamps(Date.now());
  return [
    { url: `${base}/`, changeFrequency: 'daily' },
    ...[...coming, ...past].map(({ slug }) => ({ url: `${base}/camps/${slug}` })),
    ...ABOUT.map((page) => ({ url: `${base}/about/${page}` })),
  ];
}
