import { expect, test } from '@playwright/test';
import { answerSteps } from './register-player';
import { openPage } from './sign-in';

const CAMP = '/camps/kettle-lake-harp-week';
const PLAYER = {
  name: 'Wanjiru Odhiambo',
  email: 'wanjiru@players.example',
  track: /First breath/,
  harps: ['A'],
};

test('a player goes back and reloads, and every answer is still there', async ({ browser }) => {
  const page = await openPage(browser);
  await answerSteps(page, CAMP, PLAYER);
  await page.goBack();
  await page.goBack();
  await page.reload();
  await expect(page.getByRole('checkbox', { name: 'A harp', exact: true })).toBeChecked();
  await page.goto(`${CAMP}/register/who`);
  await expect(page.getByLabel('Full name of the person who comes')).toHaveValue(PLAYER.name);
});

test('a player who is declined, then walks away, then pays, has one place', async ({ browser }) => {
  test.setTimeout(120_000);
  const page = await openPage(browser);
  await answerSteps(page, CAMP, { ...PLAYER, email: 'declined@players.example' });
  await page.getByRole('button', { name: 'Hold my place and pay' }).click();
  await page.getByRole('button', { name: /^Pay / }).click();
  await page.waitForURL((url) => url.pathname.startsWith('/pay/'));
  await page.getByRole('button', { name: 'The bank declines it', exact: true }).click();
  await page.getByRole('link', { name: 'Walk away without paying' }).click();
  await expect(page.getByText('Not paid yet')).toBeVisible();
  await page.getByRole('button', { name: /^Pay / }).click();
  await page.waitForURL((url) => url.pathname.startsWith('/pay/'));
  await page.getByRole('button', { name: /^Pay, but the bank asks/ }).click();
  await page.getByRole('button', { name: 'Yes, confirm the payment' }).click();
  await page.waitForURL(/\/my\/orders\/ord_/);
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('You have a place');
});

test('a player registers without JavaScript', async ({ browser }) => {
  const page = await openPage(browser, { javaScriptEnabled: false });
  await answerSteps(page, CAMP, { ...PLAYER, email: 'noscript@players.example' });
  await page.getByRole('button', { name: 'Hold my place and pay' }).click();
  await page.getByRole('button', { name: /^Pay / }).click();
  await page.waitForURL((url) => url.pathname.startsWith('/pay/'));
  await page.getByRole('button', { name: /^Pay / }).first().click();
  await page.waitForURL(/\/my\/orders\/ord_/);
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('You have a place');
});

test('a player who leaves a form empty is told at each field, and loses nothing', async ({ browser }) => {
  const page = await openPage(browser);
  await page.goto(`${CAMP}/register/who`);
  await page.getByLabel('Their e-mail address').fill('no at sign');
  await page.getByRole('button', { name: 'Continue' }).click();
  await expect(page.getByText('This did not go through')).toBeVisible();
  await expect(page.getByLabel('Full name of the person who comes')).toBeFocused();
  await expect(page.getByLabel('Full name of the person who comes')).toHaveAttribute('aria-invalid', 'true');
  await expect(page.getByLabel('Their e-mail address')).toHaveValue('no at sign');
});

test('a step cannot be skipped by its address', async ({ browser }) => {
  const page = await openPage(browser);
  await page.goto(`${CAMP}/register/check`);
  await expect(page).toHaveURL(/\/register\/who$/);
});
