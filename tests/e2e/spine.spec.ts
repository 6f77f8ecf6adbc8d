import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { chromium, expect, test } from '@playwright/test';
import { CHROMIUM_ARGS } from '../setup/chromium-args';
import { axePage } from './axe-page';
import { cameraArgs, writeCameraVideo } from './fake-camera';
import { ticketPicture, waitForMail } from './local-mail';
import { publishCopy } from './publish-copy';
import { answerSteps, payOrder } from './register-player';
import { openPage, signIn } from './sign-in';

const PLAYER = {
  name: 'Inês Guimarães Falcão',
  // An address of its own each run, as the mail server keeps what earlier runs were sent.
  email: `ines-${Date.now()}@players.example`,
  track: /First bends/,
  harps: ['C'],
  elective: 'Train rhythms',
};

test('an organiser publishes a camp, a player registers and pays, and the door scans the ticket out of the mail', async ({
  browser,
}) => {
  test.setTimeout(300_000);
  const organiser = await openPage(browser, { viewport: { width: 1440, height: 900 } });
  await signIn(organiser, 'organiser');
  const camp = await publishCopy(organiser, { from: 'cmp_demoa', name: 'Kettle Lake Harp Week, again' });

  const player = await openPage(browser, { viewport: { width: 390, height: 844 } });
  await answerSteps(player, camp.path, PLAYER);
  await payOrder(player);
  await player.waitForURL(/\/my\/orders\/ord_/);
  await expect(player.getByRole('heading', { level: 1 })).toHaveText('You have a place');

  const letter = await waitForMail(PLAYER.email, /^Your ticket for Kettle Lake Harp Week, again/);
  const picture = await ticketPicture(letter.id);

  const folder = mkdtempSync(join(tmpdir(), 'combwood-camera-'));
  const video = join(folder, 'ticket.y4m');
  await writeCameraVideo(picture, video);
  // The camera's picture is fixed when a browser starts, so the door has a browser of its own.
  const phone = await chromium.launch({
    executablePath: process.env.CHROMIUM_PATH || undefined,
    args: [...CHROMIUM_ARGS, ...cameraArgs(video)],
  });
  try {
    const door = await openPage(phone, {
      baseURL: process.env.E2E_APP_URL,
      viewport: { width: 390, height: 844 },
      permissions: ['camera'],
    });
    await signIn(door, 'door');
    await door.goto(`/door/${camp.id}`);
    const verdict = door.getByRole('region', { name: 'Verdict' });
    await expect(verdict.getByRole('heading', { name: 'Arrived' })).toBeVisible({ timeout: 30_000 });
    await expect(verdict).toContainText(PLAYER.name);
    await expect(verdict).toContainText('First bends');
    for (const colorScheme of ['light', 'dark'] as const) {
      await door.emulateMedia({ colorScheme });
      expect(await axePage(door), `verdict, ${colorScheme}`).toEqual([]);
    }
    await verdict.getByRole('button', { name: 'Next' }).click();
    // The ticket is still in front of the camera: the next frame is a second scan.
    await expect(verdict.getByRole('heading', { name: 'Already in' })).toBeVisible({ timeout: 30_000 });
    await expect(verdict).toContainText(/at \d\d:\d\d by Mei-Lin Chou/);
    await verdict.getByRole('button', { name: 'Take it back' }).click();
    await verdict.getByLabel('Why is it taken back?').fill('Wrong person');
    await verdict.getByRole('button', { name: 'Take the arrival back' }).click();
    await expect(verdict.getByRole('heading', { name: 'Undone' })).toBeVisible();
  } finally {
    await phone.close();
    rmSync(folder, { recursive: true, force: true });
  }
});
