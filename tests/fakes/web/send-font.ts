import { readFileSync } from 'node:fs';
import type { ServerResponse } from 'node:http';
import { createRequire } from 'node:module';

const require = createRequire(import.meta.url);
const files: Record<string, string> = {
  '/_look/head.woff2':
    '@fontsource-variable/bricolage-grotesque/files/bricolage-grotesque-latin-wght-normal.woff2',
  '/_look/body.woff2':
    '@fontsource-variable/atkinson-hyperlegible-next/files/atkinson-hyperlegible-next-latin-wght-normal.woff2',
  '/_look/mono.woff2':
    '@fontsource-variable/atkinson-hyperlegible-mono/files/atkinson-hyperlegible-mono-latin-wght-normal.woff2',
};

/** Serves the app's own three fonts; false when the path is not one of them. */
export function sendFont(res: ServerResponse, path: string): boolean {
  const file = files[path];
  if (!file) return false;
  const bytes = readFileSync(require.resolve(file));
  res.writeHead(200, { 'content-type': 'font/woff2', 'cache-control': 'max-age=86400' }).end(bytes);
  return true;
}
