import type { Page } from '@playwright/test';
import axe from 'axe-core';

type Found = { id: string; help: string; nodes: string[] };

/** What axe finds on the page by the rules of WCAG 2.2 A and AA, as it stands now. */
export async function axePage(page: Page): Promise<Found[]> {
  // Through the debugger, which the page's content policy does not bind.
  await page.evaluate(`${axe.source}; undefined`);
  return page.evaluate(async () => {
    const tags = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];
    const { axe: inPage } = window as unknown as { axe: typeof import('axe-core') };
    const { violations } = await inPage.run(document, { runOnly: { type: 'tag', values: tags } });
    return violations.map(({ id, help, nodes }) => ({
      id,
      help,
      nodes: nodes
        .slice(0, 4)
        .map((node) => `${node.target.join(' ')} ${node.failureSummary ?? ''}`.slice(0, 300)),
    }));
  });
}

/** True where the page can be read without scrolling sideways (WCAG 1.4.10). */
export const fitsWidth = (page: Page): Promise<boolean> =>
  page.evaluate(() => document.documentElement.scrollWidth <= document.documentElement.clientWidth + 1);
