import type { ServerResponse } from 'node:http';
import { escapeHtml } from '../web/html';
import type { Message } from './read-message';

/** Puts the message's own parts where its HTML says cid: (RFC 2392); a cid without a part stays as it is. */
export function showInlineParts(html: string, parts: Message['parts']): string {
  return html.replace(/cid:([^"'\s)>]+)/gi, (link, name: string) => {
    const wanted = decodeCid(name);
    const part = parts.find(({ cid }) => cid === wanted);
    return part ? escapeHtml(part.url) : link;
  });
}

function decodeCid(name: string): string {
  const plain = name.replaceAll('&amp;', '&');
  try {
    return decodeURIComponent(plain);
  } catch {
    return plain;
  }
}

/**
 * A message's HTML as a document of its own. It is a stranger's: the sandbox gives it an origin of its own and no
 * script, and the policy lets it load nothing but its own pictures and inline styles. Links open in a new tab.
 */
export function sendBody(res: ServerResponse, message: Message, origin: string): void {
  const text = `<!doctype html><meta charset="utf-8"><meta name="viewport" content="width=device-width"><base target="_blank">${showInlineParts(message.html ?? '', message.parts)}`;
  res.writeHead(200, {
    'content-type': 'text/html; charset=utf-8',
    'content-length': Buffer.byteLength(text),
    'cache-control': 'no-store',
    'content-security-policy': [
      "default-src 'none'",
      `img-src ${origin} data:`,
      "style-src 'unsafe-inline'",
      "form-action 'none'",
      "base-uri 'none'",
      `frame-ancestors ${origin}`,
      'sandbox allow-popups allow-popups-to-escape-sandbox',
    ].join('; '),
    'referrer-policy': 'no-referrer',
    'x-content-type-options': 'nosniff',
  });
  res.end(text);
}
