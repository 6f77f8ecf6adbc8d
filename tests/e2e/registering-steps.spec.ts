import { expect, type Page, test } from '@playwright/test';
import { axePage, fitsWidth } from './axe-page';
import { errorsOf, openPage } from './sign-in';

const REGISTER = '/camps/kettle-lake-harp-week/register';
const LOOKS = [
  { width: 320, height: 800, colorScheme: 'light' },
  { width: 1440, height: 900, colorScheme: 'dark' },
] as const;

/** Nothing for axe to find, and nothing to scroll sideways for (WCAG 1.4.10 asks for 320 px). */
async function fine(page: Page, where: string): Promise<void> {
  expect(await axePage(page), where).toEqual([]);
  expect(await fitsWidth(page), `${where} fits the width`).toBe(true);
}

for (const { width, height, colorScheme } of LOOKS)
  test(`a minor is registered by the person who pays, and every step can be read (${width} px, ${colorScheme})`, async ({
    browser,
  }) => {
    test.setTimeout(180_000);
    const page = await openPage(browser, { viewport: { width, height }, colorScheme });
    const go = () => page.getByRole('button', { name: 'Continue' }).click();
    await page.goto(REGISTER);
    await go();
    await expect(page.getByText('This did not go through')).toBeVisible();
    await fine(page, 'who, with errors');
    await page.getByLabel('Full name of the person who comes').fill('<b>Łucja</b> Ó Briain');
    await page.getByLabel('Their e-mail address').fill('lucja@players.con');
    await page.getByRole('radio', { name: /^Somebody else/ }).check();
    await page.getByLabel('Full name of the payer').fill('Orla Ó Briain');
    await page.getByLabel('Payer’s e-mail address').fill('orla@players.example');
    await page.getByRole('radio', { name: 'Yes, under 18' }).check();
    await go();
    await expect(page.getByText('Did you mean lucja@players.com?').first()).toBeVisible();
    await page.getByLabel('Their e-mail address').fill('lucja@players.example');
    await go();
    await page.waitForURL(/\/track$/);
    await fine(page, 'track');
    await page.getByRole('radio', { name: /^First breath/ }).check();
    await go();
    await page.waitForURL(/\/harps$/);
    await page.getByLabel('Key').selectOption('G');
    await page.getByRole('button', { name: 'Add this harp' }).click();
    await expect(page.getByRole('checkbox', { name: 'Gm natural minor harp' })).toBeChecked();
    await fine(page, 'harps');
    await go();
    await page.waitForURL(/\/needs$/);
    // The payer of a minor is offered as guardian: nothing is asked twice.
    await expect(page.getByLabel('Guardian’s full name')).toHaveValue('Orla Ó Briain');
    await page.getByLabel('Whom should we call?').fill('A neighbour');
    await page.getByLabel('Their phone number').fill('ask at the desk');
    await page.getByLabel('Guardian’s phone number').fill('030 5550103');
    await go();
    await expect(page.getByText('“ask at the desk” is not a phone number').first()).toBeVisible();
    await expect(page.getByText('A parent or guardian must agree').first()).toBeVisible();
    await fine(page, 'needs, with errors');
    await page.getByLabel('Their phone number').fill('+44 20 7946 0018');
    await page.getByRole('checkbox', { name: /^I am the parent or guardian/ }).check();
    await go();
    await page.waitForURL(/\/check$/);
    await expect(page.getByText('<b>Łucja</b> Ó Briain')).toBeVisible();
    await fine(page, 'check');
    await page.getByRole('link', { name: 'Change: Harps you own' }).click();
    await go();
    await page.waitForURL(/\/check$/);
    await page.getByRole('button', { name: 'Hold my place and pay' }).click();
    await page.waitForURL(/\/pay\?order=/);
    await fine(page, 'pay');
    await page.getByRole('button', { name: 'Change my answers' }).click();
    await page.waitForURL(/\/check$/);
    await page.getByRole('button', { name: 'Hold my place and pay' }).click();
    await page.getByRole('button', { name: /^Pay / }).click();
    await page.waitForURL((url) => url.pathname.startsWith('/pay/'));
    await page.getByRole('button', { name: /^Pay / }).first().click();
    await expect(page.getByRole('heading', { level: 1 })).toHaveText('You have a place');
    await fine(page, 'paid');
    expect(errorsOf(page)).toEqual([]);
  });
