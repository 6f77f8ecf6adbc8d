import { gzipSync } from 'node:zlib';

export type Script = { url: string; bytes: number; gzip: number };

/** Every script that a browser of today loads for the page: by its script tags, `nomodule` ones left out. */
export async function scriptsOf(url: string): Promise<Script[]> {
  const page = await fetch(url);
  if (!page.ok) throw new Error(`${url} answered ${page.status}`);
  const tags = [...(await page.text()).matchAll(/<script\b[^>]*>/g)].map(([tag]) => tag);
  const sources = tags
    .filter((tag) => !/\snomodule\b/i.test(tag))
    .flatMap((tag) => /\ssrc="([^"]+)"/.exec(tag)?.[1] ?? []);
  return Promise.all(
    [...new Set(sources)].map(async (source) => {
      const at = new URL(source.replaceAll('&amp;', '&'), url).href;
      const answer = await fetch(at);
      if (!answer.ok) throw new Error(`${at} answered ${answer.status}`);
      const body = Buffer.from(await answer.arrayBuffer());
      return { url: at, bytes: body.length, gzip: gzipSync(body, { level: 6 }).length };
    }),
  );
}

export const gzipTotal = (scripts: readonly Script[]): number =>
  scripts.reduce((sum, { gzip }) => sum + gzip, 0);
