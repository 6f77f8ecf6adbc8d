'use client';

import { useServerInsertedHTML } from 'next/navigation';

type Answers = { combwoodAnswer?: { getStore(): { readonly statusCode: number } | undefined } };

/**
 * A page that ends in `notFound()` or the like is answered with the right status and an empty body, which only
 * JavaScript fills. When the status has turned bad since this was rendered, the head sends those without JavaScript on
 * to a page with the words.
 */
export function NoScriptWay() {
  const answer = (globalThis as Answers).combwoodAnswer?.getStore();
  const atFirst = answer?.statusCode ?? 0;
  let said = false;
  useServerInsertedHTML(() => {
    const now = answer?.statusCode ?? 0;
    if (said || atFirst >= 400 || now < 400) return null;
    said = true;
    return (
      <noscript>
        <meta httpEquiv="refresh" content={`0;url=/dead-end/${now === 404 || now === 403 ? now : 500}`} />
      </noscript>
    );
  });
  return null;
}
