import { expect, test } from '@playwright/test';
import { letterText, waitForMail } from './local-mail';
import { errorsOf, openPage } from './sign-in';

const PASSWORD = 'a reed plate and nine screws';

test('a teacher opens an account, sets up a camp from nothing and publishes it', async ({ browser }) => {
  test.setTimeout(240_000);
  const email = `ida-${Date.now()}@organisers.example`;
  const page = await openPage(browser, { viewport: { width: 1440, height: 900 } });
  const fill = (label: string, value: string) => page.getByLabel(label, { exact: true }).fill(value);
  const press = (name: string) => page.getByRole('button', { name, exact: true }).click();

  await page.goto('/sign-up');
  await page.getByLabel(/name/i).first().fill('Ida Størmer');
  await fill('E-mail', email);
  await page.getByLabel(/^Password/).fill(PASSWORD);
  await page.getByRole('button', { name: /account/i }).click();
  const letter = await waitForMail(email, /^Confirm your e-mail address/);
  const link = /https?:\S+\/verify\S+/.exec(await letterText(letter.id))?.[0] ?? '';
  await page.goto(link);
  await press('Yes, this address is mine');
  // This browser opened the account, so proving the address signs it in.
  await page.waitForURL((url) => !url.pathname.startsWith('/verify'));
  await page.goto('/organise/new');
  await page.waitForURL(/\/organise\/new$/);
  await fill('Name', 'Fjord Harp Circle');
  await fill('E-mail for players', email);
  await page.locator('main form').getByRole('button').last().click();
  await page.waitForURL(/\/organise\/organisations\/org_/);
  await page
    .getByRole('link', { name: /New camp/ })
    .first()
    .click();
  await page.waitForURL(/\/camps\/new$/);
  await fill('Name', 'Fjord Harp Days');
  await fill('First day', '2031-05-04');
  await fill('Last day', '2031-05-02');
  await page.getByLabel('Time zone of the venue').selectOption('Europe/Oslo');
  await page.getByLabel('Currency').selectOption('NOK');
  await press('Make the draft');
  await expect(page.getByLabel('Last day', { exact: true })).toHaveAttribute('aria-invalid', 'true');
  await expect(page.getByLabel('Name', { exact: true })).toHaveValue('Fjord Harp Days');
  await fill('Last day', '2031-05-06');
  await press('Make the draft');
  await page.waitForURL(/\/organise\/camps\/cmp_/);
  const camp = /\/organise\/camps\/cmp_[0-9a-z]+/.exec(page.url())?.[0] ?? '';

  await page.goto(`${camp}/details`);
  await fill('Venue', 'Boathouse');
  await fill('Places in all', '12');
  await page.getByLabel(/^Price of a place/).fill('240');
  await page.getByLabel(/^Refund terms/).fill('All but 20 until a month before.');
  await page.getByLabel(/^Summary/).fill('Three days by the water.');
  await press('Save');
  await page.goto(`${camp}/tracks/new`);
  await fill('Name', 'Bending');
  await page.getByLabel('Level').selectOption('bending');
  await page.getByLabel(/^Gate/).fill('You bend 4 draw.');
  await page.getByLabel(/^Places/).fill('12');
  await press('Add the track');
  for (const [name, seats] of [
    ['Boat shed', '14'],
    ['Kitchen', '13'],
  ] as const) {
    await page.goto(`${camp}/rooms/new`);
    await fill('Name', name);
    await fill('Seats', seats);
    await page.getByRole('radio', { name: 'Acoustic' }).check();
    await press('Add the room');
  }
  await page.goto(`${camp}/instructors/new`);
  await fill('Name', 'Ida Størmer');
  await press('Add the instructor');
  for (const title of ['Second position', 'Slow blues']) {
    await page.goto(`${camp}/workshops/new`);
    await fill('Title', title);
    await page.getByLabel('Kind', { exact: true }).selectOption('technique');
    await page.getByRole('radio', { name: /^Core workshop/ }).check();
    await page.getByRole('checkbox', { name: 'Bending' }).check();
    await page.getByRole('checkbox', { name: 'Ida Størmer' }).check();
    await press('Add a harp to bring');
    await page.getByRole('radio', { name: 'By a song and a position' }).check();
    await page.getByLabel('Song in').selectOption('E');
    await page.getByLabel('Played in').selectOption('2');
    // What the key means is said wherever a key is named.
    await expect(page.getByText('A harp').first()).toBeVisible();
    await press('Add the workshop');
    await page.waitForURL((url) => !url.pathname.endsWith('/new'));
  }

  /** Chooses the option whose words begin with these: some say more, such as what fits. */
  const choose = async (label: string, words: string) => {
    const select = page.locator('#place').getByLabel(label, { exact: true });
    const value = await select.locator('option', { hasText: words }).first().getAttribute('value');
    await select.selectOption(value ?? '');
  };
  const place = async (workshop: string, day: string, room: string) => {
    await page.goto(`${camp}/timetable`);
    await page.locator('#place summary').click();
    await choose('Workshop', workshop);
    await page.locator('#place').getByLabel('Day', { exact: true }).selectOption(day);
    await page
      .locator('#place')
      .getByLabel(/^Or starts at/)
      .fill('10:00');
    await choose('Room', room);
    await press('Place');
  };
  await place('Second position', '2031-05-05', 'Boat shed');
  await expect(page.getByRole('link', { name: /Second position/ }).first()).toBeVisible();
  // The same track and the same instructor cannot be in two rooms at once; both are said in words.
  await place('Slow blues', '2031-05-05', 'Kitchen');
  await expect(page.getByText('This did not go through')).toBeVisible();
  await expect(page.locator('#place')).toContainText(/Ida Størmer/);

  await place('Slow blues', '2031-05-06', 'Kitchen');
  await expect(page.getByText('This did not go through')).toBeHidden();
  // The checklist names what is missing, and there is no way to publish before it is mended.
  await page.goto(camp);
  await expect(page.getByRole('button', { name: 'Publish', exact: true })).toHaveCount(0);
  await page.getByRole('link', { name: 'Mend venue' }).click();
  await fill('Address', '3 Shore Road');
  await press('Save');
  await page.goto(camp);
  await press('Publish');
  await page.getByRole('link', { name: 'Public page' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Fjord Harp Days');
  await expect(page.getByText('12 of 12 places left').first()).toBeVisible();
  expect(errorsOf(page)).toEqual([]);
});
