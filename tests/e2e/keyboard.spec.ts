import { expect, type Page, test } from '@playwright/test';
import { errorsOf, openPage } from './sign-in';

/** Tabs until the element that holds the focus fits; fails when the page is gone round. */
async function tabTo(page: Page, fits: string): Promise<void> {
  for (let presses = 0; presses < 120; presses += 1) {
    await page.keyboard.press('Tab');
    const here = await page.evaluate(() => {
      const at = document.activeElement;
      if (!(at instanceof HTMLElement)) return '';
      const labels =
        at instanceof HTMLInputElement
          ? [...(at.labels ?? [])].map((label) => label.textContent).join(' ')
          : '';
      const box = at.getBoundingClientRect();
      // WCAG 2.4.11: what has the focus is in sight.
      const seen = box.bottom > 0 && box.top < innerHeight && getComputedStyle(at).outlineStyle !== 'none';
      return `${at.getAttribute('aria-label') ?? ''} ${labels} ${at.textContent} ${at.getAttribute('name') ?? ''}|${seen}`;
    });
    if (here.includes(fits)) {
      expect(here, 'the focus is in sight and has its ring').toMatch(/\|true$/);
      return;
    }
  }
  throw new Error(`Nothing with “${fits}” takes the focus on ${page.url()}`);
}

test('a player registers and pays with the keyboard alone', async ({ browser }) => {
  test.setTimeout(180_000);
  const page = await openPage(browser, { viewport: { width: 1440, height: 900 } });
  const press = (key: string) => page.keyboard.press(key);
  const go = async (words: string, key = 'Enter') => {
    await tabTo(page, words);
    await press(key);
  };
  await page.goto('/camps/kettle-lake-harp-week');
  await go('Register');
  await page.waitForURL(/register\/who$/);
  await tabTo(page, 'Full name of the person who comes');
  await page.keyboard.type('Bartłomiej Szczęsny');
  await tabTo(page, 'Their e-mail address');
  await page.keyboard.type('bartek@players.example');
  await go('The person who comes', 'Space');
  await go('No, 18 or older', 'Space');
  await go('Continue');
  await page.waitForURL(/register\/track$/);
  await go('First breath', 'Space');
  await go('Continue');
  await page.waitForURL(/register\/harps$/);
  await go('C harp', 'Space');
  await go('Continue');
  await page.waitForURL(/register\/needs$/);
  await tabTo(page, 'Whom should we call?');
  await page.keyboard.type('A brother');
  await tabTo(page, 'Their phone number');
  await page.keyboard.type('+49 30 5550101');
  await go('Continue');
  await page.waitForURL(/register\/check$/);
  await go('Hold my place and pay');
  await page.waitForURL(/register\/pay/);
  await go('Pay ');
  await page.waitForURL((url) => url.pathname.startsWith('/pay/'));
  await go('Pay ');
  await page.waitForURL(/\/my\/orders\/ord_/);
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('You have a place');
  expect(errorsOf(page)).toEqual([]);
});
