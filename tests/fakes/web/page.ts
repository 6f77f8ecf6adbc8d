import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import type { ServerResponse } from 'node:http';
import { html, Markup } from './html';

const css = readFileSync(new URL('./look.css', import.meta.url), 'utf8');
const cssHash = createHash('sha256').update(css).digest('base64');

export type Page = {
  title: string;
  /** One sentence across the top that says what this is; shown on every page. */
  notice: string;
  width: 'narrow' | 'wide';
  body: Markup;
};

function document({ title, notice, width, body }: Page): string {
  return `<!doctype html>${html`<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="robots" content="noindex">
<title>${title}</title>
<link rel="icon" href="data:,">
<style>${new Markup(css)}</style>
</head>
<body>
<a class="skip" href="#main">Skip to the page</a>
<header class="notice ${width}"><p>${notice}</p></header>
<main id="main" class="sheet ${width}">
${body}
</main>
</body>
</html>`}`;
}

/**
 * No script, no outside resource. `formTargets` are origins a form's answer may redirect to: browsers apply
 * form-action to the redirect too.
 */
export function sendPage(res: ServerResponse, status: number, page: Page, formTargets: string[] = []): void {
  const text = document(page);
  res.writeHead(status, {
    'content-type': 'text/html; charset=utf-8',
    'content-length': Buffer.byteLength(text),
    'cache-control': 'no-store',
    'content-security-policy': [
      "default-src 'none'",
      `style-src 'sha256-${cssHash}'`,
      "font-src 'self'",
      "img-src 'self' data:",
      "frame-src 'self'",
      `form-action ${["'self'", ...new Set(formTargets)].join(' ')}`,
      "base-uri 'none'",
      "frame-ancestors 'none'",
    ].join('; '),
    // same-origin, not no-referrer: with no-referrer a form posts `Origin: null` and the guard would refuse it
    'referrer-policy': 'same-origin',
    'x-content-type-options': 'nosniff',
  });
  res.end(text);
}
