import { expect, type Page } from '@playwright/test';

/** Copies a camp to a new name as its organiser, looks at the preview and publishes it. */
export async function publishCopy(
  page: Page,
  of: { from: string; name: string },
): Promise<{ id: string; path: string }> {
  await page.goto(`/organise/camps/${of.from}/copy`);
  await page.getByLabel('Name of the new camp').fill(of.name);
  await page.getByRole('button', { name: 'Make the copy' }).click();
  await page.waitForURL(
    (url) => /^\/organise\/camps\/cmp_/.test(url.pathname) && !url.pathname.includes(of.from),
  );
  const id = new URL(page.url()).pathname.split('/')[3] ?? '';
  await page.goto(`/organise/camps/${id}/preview`);
  await expect(page.getByRole('heading', { name: of.name })).toBeVisible();
  await page.goto(`/organise/camps/${id}`);
  await page.getByRole('button', { name: 'Publish' }).click();
  const open = page.getByRole('link', { name: 'Public page' });
  await expect(open).toBeVisible();
  return { id, path: (await open.getAttribute('href')) ?? '' };
}
