import type { ServerResponse } from 'node:http';
import type { OpenedMessage } from './read-message';

// Shown in place; anything else, SVG and HTML above all, is only ever saved to a file.
const shown = new Set(['image/png', 'image/jpeg', 'image/gif', 'image/webp']);
const plainType = /^[\w.+-]+\/[\w.+-]+$/;

/** RFC 6266 with RFC 8187: a plain name for old readers and the real one in UTF-8. */
export function contentDisposition(kind: 'inline' | 'attachment', filename: string): string {
  const plain = filename.replace(/[^\x20-\x7e]|["\\/]/g, '_');
  const coded = encodeURIComponent(filename).replace(
    /['()*!]/g,
    (sign) => `%${sign.charCodeAt(0).toString(16).toUpperCase()}`,
  );
  return `${kind}; filename="${plain}"; filename*=UTF-8''${coded}`;
}

/** False when the message has no such part. */
export function sendPart(res: ServerResponse, { message, contents }: OpenedMessage, n: number): boolean {
  const part = message.parts[n];
  const content = contents[n];
  if (!part || !content) return false;
  const inline = shown.has(part.contentType);
  res.writeHead(200, {
    'content-type': plainType.test(part.contentType) ? part.contentType : 'application/octet-stream',
    'content-length': content.length,
    'content-disposition': contentDisposition(inline ? 'inline' : 'attachment', part.filename ?? `part-${n}`),
    'content-security-policy': "default-src 'none'; sandbox",
    'x-content-type-options': 'nosniff',
    'cache-control': 'no-store',
  });
  res.end(content);
  return true;
}
