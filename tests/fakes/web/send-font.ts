import { readFileSync } from 'node:fs';
import type { ServerResponse } from 'node:http';
import { createRequire } from 'node:module';

const require = createRequire(import.meta.url);
const font = (family: string, subset: string) =>
  `@fontsource-variable/${family}/files/${family}-${subset}-wght-normal.woff2`;
const files: Record<string, string> = {
  '/_look/head.woff2': font('bricolage-grotesque', 'latin'),
  '/_look/head-ext.woff2': font('bricolage-grotesque', 'latin-ext'),
  '/_look/body.woff2': font('atkinson-hyperlegible-next', 'latin'),
  '/_look/body-ext.woff2': font('atkinson-hyperlegible-next', 'latin-ext'),
  '/_look/mono.woff2': font('atkinson-hyperlegible-mono', 'latin'),
  '/_look/mono-ext.woff2': font('atkinson-hyperlegible-mono', 'latin-ext'),
};

/** Serves the app's own three fonts; false when the path is not one of them. */
export function sendFont(res: ServerResponse, path: string): boolean {
  const file = files[path];
  if (!file) return false;
  const bytes = readFileSync(require.resolve(file));
  res.writeHead(200, { 'content-type': 'font/woff2', 'cache-control': 'max-age=86400' }).end(bytes);
  return true;
}
