import type { MetadataRoute } from 'next';

/** For phones that keep the site beside their programs: the door crew's, above all. */
export default function manifest(): MetadataRoute.Manifest {
  return {
    name: 'Combwood',
    short_name: 'Combwood',
    description: 'Harmonica camps: programme, places, packing lists, tickets.',
    start_url: '/',
    display: 'minimal-ui',
    background_color: '#f3f5f1',
    theme_color: '#0e4a45',
    icons: [{ src: '/icon.svg', sizes: 'any', type: 'image/svg+xml' }],
  };
}
