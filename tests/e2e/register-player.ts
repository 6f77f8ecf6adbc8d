import { expect, type Page } from '@playwright/test';

export type Player = { name: string; email: string; track: RegExp; harps: string[]; elective?: string };

/** Walks the steps from the camp page up to the button that holds the place, by mouse. */
export async function answerSteps(page: Page, campPath: string, player: Player): Promise<void> {
  await page.goto(campPath);
  await page
    .getByRole('link', { name: /^Register/ })
    .first()
    .click();
  await page.getByLabel('Full name of the person who comes').fill(player.name);
  await page.getByLabel('Their e-mail address').fill(player.email);
  await page.getByRole('radio', { name: 'The person who comes' }).check();
  await page.getByRole('radio', { name: 'No, 18 or older' }).check();
  await page.getByRole('button', { name: 'Continue' }).click();
  await page.getByRole('radio', { name: player.track }).check();
  if (player.elective) await page.getByRole('checkbox', { name: player.elective }).check();
  await page.getByRole('button', { name: 'Continue' }).click();
  for (const harp of player.harps)
    await page.getByRole('checkbox', { name: `${harp} harp`, exact: true }).check();
  await page.getByRole('button', { name: 'Continue' }).click();
  await page.getByLabel('Whom should we call?').fill('A sister');
  await page.getByLabel('Their phone number').fill('+49 30 5550100');
  await page.getByRole('button', { name: 'Continue' }).click();
  await expect(page).toHaveURL(/\/register\/check$/);
}

/** From check answers to the payment service's own page, where the person pays. */
export async function payOrder(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Hold my place and pay' }).click();
  await page.getByRole('button', { name: /^Pay / }).click();
  await page.waitForURL((url) => url.pathname.startsWith('/pay/'));
  await page.getByRole('button', { name: /^Pay / }).first().click();
}
