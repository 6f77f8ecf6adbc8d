import { readFileSync } from 'node:fs';
import { createServer, type Server } from 'node:http';
import { createRequire } from 'node:module';
import { expect, type Page, test } from '@playwright/test';
import nodemailer from 'nodemailer';
import QRCode from 'qrcode';
import Stripe from 'stripe';
import { type MailServer, startMailServer } from '../fakes/mail/start-mail-server';
import { type StripeMock, startStripeMock } from '../fakes/stripe/start-stripe-mock';
import { closeServer, listenLocally } from '../fakes/web/listen-locally';

// The pages of the two stand-ins, run here on their own: no application is needed to look at them.
const axe = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');
let mock: StripeMock;
let mail: MailServer;
let shop: Server;
let shopUrl: string;
let stripe: Stripe;
/** What the other server was asked for. */
const asked: string[] = [];

test.beforeAll(async () => {
  shop = createServer((req, res) => {
    asked.push(String(req.url));
    res.writeHead(200, { 'content-type': 'text/html' }).end(`<title>Camp</title><h1>Back at ${req.url}</h1>`);
  });
  shopUrl = `http://127.0.0.1:${await listenLocally(shop, 0)}`;
  mock = await startStripeMock({ port: 0, merchant: 'Slate Ridge Harp Society' });
  mail = await startMailServer({ smtpPort: 0, webPort: 0 });
  stripe = new Stripe('sk_test_e2e', {
    host: '127.0.0.1',
    port: mock.port,
    protocol: 'http',
    telemetry: false,
  });
  const sender = nodemailer.createTransport({ host: '127.0.0.1', port: mail.smtpPort });
  await sender.sendMail({
    from: { name: 'Kettle Lake Harp Week', address: 'camps@example.test' },
    to: { name: 'Zoë Ångström', address: 'zoe@example.test' },
    subject: 'Your ticket',
    text: 'Bring the A harp.',
    html: `<html lang="en"><body><h1>Your ticket</h1><img src="cid:qr@x" alt="QR code"><a href="${shopUrl}/order">Your order</a>
<script>parent.document.title = document.title = 'script ran'</script><img src="${shopUrl}/spy.png" alt=""></body></html>`,
    attachments: [{ filename: 'qr.png', content: await QRCode.toBuffer('ticket'), cid: 'qr@x' }],
  });
  sender.close();
});
test.afterAll(async () => {
  await mock.close();
  await mail.close();
  await closeServer(shop);
});

async function newSession(email?: string) {
  const price = (name: string, unit_amount: number) => ({
    quantity: 1,
    price_data: { currency: 'usd', unit_amount, product_data: { name } },
  });
  const session = await stripe.checkout.sessions.create({
    mode: 'payment',
    line_items: [
      price('Kettle Lake Harp Week: Intermediate track, Bartholomew Featherstonehaugh-Nguyễn', 48_000),
    ],
    success_url: `${shopUrl}/paid`,
    cancel_url: `${shopUrl}/left`,
    ...(email ? { customer_email: email } : {}),
  });
  return session.id;
}
const press = (id: string, outcome: string) =>
  fetch(`${mock.url}/_mock/sessions/${id}/outcome`, { method: 'POST', body: JSON.stringify({ outcome }) });

async function problems(page: Page): Promise<string[]> {
  await page.evaluate(axe);
  return page.evaluate(async () => {
    type Found = { id: string; nodes: { html: string }[] };
    const { axe } = window as unknown as { axe: { run: () => Promise<{ violations: Found[] }> } };
    const wide = document.documentElement.scrollWidth > window.innerWidth ? ['wider than the screen'] : [];
    const small = [...document.querySelectorAll('button, .button, input, select')]
      .filter((item) => item.getBoundingClientRect().height > 0 && item.getBoundingClientRect().height < 44)
      .map((item) => `target under 44 px: ${item.outerHTML}`);
    const { violations } = await axe.run();
    return [...wide, ...small, ...violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`)];
  });
}

for (const colorScheme of ['light', 'dark'] as const)
  for (const width of [390, 1440])
    test(`anyone reads every page of the stand-ins, ${colorScheme}, ${width} px`, async ({ browser }) => {
      const [open, declined, waiting, paid, expired, slow, lost] = await Promise.all([
        newSession(),
        newSession('kim@example.test'),
        newSession('kim@example.test'),
        newSession(),
        newSession(),
        newSession(),
        newSession(),
      ]);
      for (const id of [slow, lost]) await press(id, 'pay-later');
      await fetch(`${mock.url}/_mock/sessions/${lost}/settle`, {
        method: 'POST',
        body: '{"status":"failed"}',
      });
      await press(declined, 'decline');
      await press(waiting, 'needs-step');
      await press(paid, 'pay');
      await stripe.checkout.sessions.expire(expired);
      const { messages } = (await (await fetch(`${mail.url}/api/messages`)).json()) as {
        messages: { id: string }[];
      };
      const message = `${mail.url}/messages/${messages[0]?.id}`;
      const page = await browser.newPage({ colorScheme, viewport: { width, height: 900 } });
      const pay = [open, declined, waiting, `${waiting}/confirm`, paid, expired, slow, lost, 'none'];
      const addresses = [
        ...pay.map((path) => `${mock.url}/pay/${path}`),
        `${mock.url}/_mock`,
        `${mail.url}/`,
        `${mail.url}/?to=nobody`,
        `${mail.url}/delete`,
        message,
        `${message}/raw`,
      ];
      for (const address of addresses) {
        await page.goto(address);
        expect(await problems(page), address).toEqual([]);
      }
      await page.close();
    });

test('a player pays with the keyboard alone and without JavaScript, after the bank said no', async ({
  browser,
}) => {
  const context = await browser.newContext({ javaScriptEnabled: false });
  const page = await context.newPage();
  const session = await newSession();
  await page.goto(`${mock.url}/pay/${session}`);
  const to = async (name: string) => {
    for (let i = 0; i < 20; i += 1) {
      await page.keyboard.press('Tab');
      if (
        (await page
          .locator(':focus')
          .textContent()
          .catch(() => '')) === name
      )
        return;
    }
    throw new Error(`“${name}” was not reached with Tab`);
  };
  await to('The bank declines it');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('alert')).toContainText('The bank declined this payment');
  await to('Pay, but the bank asks me to confirm first');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Your bank asks you to confirm');
  await to('Yes, confirm the payment');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Back at /paid');
  expect((await stripe.checkout.sessions.retrieve(session)).payment_status).toBe('paid');
  await page.goto(`${mock.url}/pay/${await newSession()}`);
  await to('Walk away without paying');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Back at /left');
  await context.close();
});

test('a reader sees a message’s own picture; its script and its spying picture do nothing; links open beside', async ({
  page,
}) => {
  // by the other name of this machine, as a person may type it
  await page.goto(`${mail.url.replace('127.0.0.1', 'localhost')}/?to=zoe`);
  await page.getByRole('link', { name: 'Your ticket' }).click();
  const message = page.frameLocator('iframe');
  await expect(message.getByRole('heading', { name: 'Your ticket' })).toBeVisible();
  const picture = message.getByRole('img', { name: 'QR code' });
  await expect
    .poll(() => picture.evaluate((image: HTMLImageElement) => image.naturalWidth))
    .toBeGreaterThan(50);
  await expect(page).toHaveTitle('Your ticket');
  const beside = page.context().waitForEvent('page');
  await message.getByRole('link', { name: 'Your order' }).click();
  await expect((await beside).getByRole('heading')).toHaveText('Back at /order');
  expect(asked).toContain('/order');
  expect(asked).not.toContain('/spy.png');
});
