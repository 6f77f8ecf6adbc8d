import type { Browser, BrowserContextOptions, Page } from '@playwright/test';
import { DEMO_PASSWORD, SIGN_INS } from '../../db/seed/demo-sign-ins.mjs';

export type DemoRole = 'organiser' | 'treasurer' | 'instructor' | 'door' | 'attendee';

export const emailOf = (role: DemoRole): string => SIGN_INS.find((known) => known.role === role)?.email ?? '';

/** Signs in through the form, as a person would. */
export async function signIn(page: Page, role: DemoRole): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(emailOf(role));
  await page.getByLabel('Password').fill(DEMO_PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
}

/** A page of a new browser context that fails the test when the browser reports an error. */
export async function openPage(browser: Browser, options: BrowserContextOptions = {}): Promise<Page> {
  const context = await browser.newContext(options);
  const page = await context.newPage();
  watchErrors(page);
  return page;
}

const seen = new WeakMap<Page, string[]>();

/** Collects what the browser complains about; `errorsOf` gives it back. */
export function watchErrors(page: Page): void {
  const errors: string[] = [];
  seen.set(page, errors);
  page.on('pageerror', (error) => errors.push(`${page.url()}: ${error.message}`));
  page.on('console', (message) => {
    if (message.type() === 'error') errors.push(`${page.url()}: ${message.text()}`);
  });
}

export const errorsOf = (page: Page): string[] => seen.get(page) ?? [];
