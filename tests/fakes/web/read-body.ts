import type { IncomingMessage } from 'node:http';

export class BodyTooLarge extends Error {}

/** The whole body as text; throws BodyTooLarge beyond `limit` bytes. */
export async function readBody(req: IncomingMessage, limit = 1_000_000): Promise<string> {
  const chunks: Buffer[] = [];
  let size = 0;
  for await (const chunk of req) {
    size += chunk.length;
    if (size > limit) throw new BodyTooLarge(`body is larger than ${limit} bytes`);
    chunks.push(chunk);
  }
  return Buffer.concat(chunks).toString('utf8');
}
