import { expect, test } from '@playwright/test';
import { axePage } from './axe-page';
import { openPage, signIn } from './sign-in';

test('the door finds a player by name while the server is away, and records them once when it is back', async ({
  browser,
}) => {
  const door = await openPage(browser, { viewport: { width: 390, height: 844 } });
  await signIn(door, 'door');
  await door.goto('/door/cmp_demob');
  await door.getByLabel('A few letters of the name').fill('freja');
  const player = door.getByRole('button', { name: /Freja .*Expected/ }).first();
  await expect(player).toBeVisible();
  // The first try reaches the server and its answer is lost: the worst of the ways to have no signal.
  let tries = 0;
  await door.route('**/api/door/*/scans', async (route) => {
    tries += 1;
    if (tries > 1) return route.continue();
    await route.fetch();
    await route.abort();
  });
  await player.click();
  await expect(door.getByText('Not recorded yet')).toBeVisible();
  expect(await axePage(door)).toEqual([]);
  await door.getByRole('button', { name: 'Send it again' }).click();
  // The same scan, the same answer: they arrived with the first one.
  await expect(door.getByRole('heading', { name: 'Arrived' })).toBeVisible();
  await door.getByRole('button', { name: 'Take it back' }).click();
  await door.getByRole('button', { name: 'Take the arrival back' }).click();
  await expect(door.getByRole('alert').filter({ hasText: 'Say in a word or two' })).toBeVisible();
  await door.getByLabel('Why is it taken back?').fill('Only a test');
  await door.getByRole('button', { name: 'Take the arrival back' }).click();
  await expect(door.getByRole('heading', { name: 'Undone' })).toBeVisible();
});
