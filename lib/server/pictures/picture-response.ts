import 'server-only';

/** Headers of a picture: never sniffed, never run, kept by caches only where everyone may see it. */
export const pictureResponse = ({
  content,
  open,
}: {
  content: Uint8Array<ArrayBuffer>;
  open: boolean;
}): Response =>
  new Response(content, {
    headers: {
      'content-type': 'image/webp',
      'content-length': String(content.byteLength),
      'content-disposition': 'inline',
      'content-security-policy': "default-src 'none'; sandbox",
      'x-content-type-options': 'nosniff',
      // An id names one picture for ever: a new upload is a new id.
      'cache-control': open ? 'public, max-age=31536000, immutable' : 'private, no-store',
    },
  });
