import '@fontsource-variable/bricolage-grotesque/opsz.css';
import '@fontsource-variable/atkinson-hyperlegible-next/wght.css';
import '@fontsource-variable/atkinson-hyperlegible-mono/wght.css';
import './globals.css';
import type { Metadata, Viewport } from 'next';
import type { ReactNode } from 'react';
import { NoScriptWay } from '@/components/ui/no-script-way';
import { env } from '@/lib/server/env';

export function generateMetadata(): Metadata {
  return {
    metadataBase: new URL(env().BASE_URL),
    title: { default: 'Combwood', template: '%s · Combwood' },
    description: 'Harmonica camps: programme, places, packing lists.',
    formatDetection: { telephone: false, email: false, address: false },
  };
}

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#f3f5f1' },
    { media: '(prefers-color-scheme: dark)', color: '#12201f' },
  ],
};

// Every page reads SQLite and carries the request's CSP nonce, so none may be frozen at build.
export const dynamic = 'force-dynamic';

export default function RootLayout({ children }: { children: ReactNode }) {
  return (
    <html lang="en">
      <body>
        <a
          href="#main"
          className="sr-only focus:not-sr-only focus:fixed focus:left-2 focus:top-2 focus:z-50 focus:bg-pine focus:px-4 focus:py-3 focus:text-on-pine"
        >
          Skip to content
        </a>
        <NoScriptWay />
        {children}
      </body>
    </html>
  );
}
