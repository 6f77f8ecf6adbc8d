import 'server-only';

const TYPES = {
  pdf: 'application/pdf',
  ics: 'text/calendar; charset=utf-8',
} as const;

/** A personal file. Its name is ours (letters, digits, dashes), never what a person typed (ASVS 5.4.2). */
export function download(body: Buffer | string, name: string, kind: keyof typeof TYPES): Response {
  return new Response(typeof body === 'string' ? body : Uint8Array.from(body), {
    headers: {
      'content-type': TYPES[kind],
      'content-disposition': `attachment; filename="${name.replace(/[^A-Za-z0-9-]/g, '')}.${kind}"`,
      'cache-control': 'private, no-store',
    },
  });
}
