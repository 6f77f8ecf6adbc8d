import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import nodemailer, { type SendMailOptions } from 'nodemailer';
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import type { Message } from '@/tests/fakes/mail/read-message';
import { type MailServer, startMailServer } from '@/tests/fakes/mail/start-mail-server';

const folder = mkdtempSync(join(tmpdir(), 'mail-test-'));
let mail: MailServer;

beforeAll(async () => {
  mail = await startMailServer({ smtpPort: 0, webPort: 0, stateFolder: folder });
});
afterAll(async () => {
  await mail.close();
  rmSync(folder, { recursive: true });
});
beforeEach(async () => {
  await api('DELETE', 'messages');
  await api('DELETE', 'faults');
});

async function api<T = Record<string, unknown>>(method: string, path: string, body?: object) {
  const answer = await fetch(`${mail.url}/api/${path}`, {
    method,
    ...(body ? { body: JSON.stringify(body) } : {}),
  });
  return { status: answer.status, body: (await answer.json()) as T };
}
const messages = async (query = '') =>
  (await api<{ messages: Message[] }>('GET', `messages${query}`)).body.messages;

// The smallest PNG there is to send: one transparent pixel.
const png = Buffer.from(
  'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==',
  'base64',
);

async function send(overrides: SendMailOptions = {}, smtp: object = {}) {
  const sender = nodemailer.createTransport({ host: '127.0.0.1', port: mail.smtpPort, ...smtp });
  try {
    return await sender.sendMail({
      from: { name: 'Kettle Lake Harp Week', address: 'camps@example.test' },
      to: { name: 'Zoë Ångström', address: 'zoe@example.test' },
      subject: 'Your ticket: Ångström, 2nd position → A harp',
      text: 'Bring the A harp.',
      html: '<h1>Ticket</h1><img src="cid:qr@combwood" alt="QR code"><a href="http://127.0.0.1:9/o">Order</a>',
      attachments: [
        { filename: 'qr.png', content: png, cid: 'qr@combwood' },
        { filename: 'packing – öäü.pdf', content: Buffer.from('%PDF-1.7'), contentType: 'application/pdf' },
      ],
      ...overrides,
    });
  } finally {
    sender.close();
  }
}
const failure = (work: Promise<unknown>) =>
  work.then(
    () => null,
    (error: { responseCode?: number; code?: string }) => error,
  );

describe('taking and reading', () => {
  test('a message is kept with its parts, and the inline picture comes back byte for byte', async () => {
    const sent = await send();
    const [summary] = await messages();
    expect(summary).toMatchObject({
      subject: 'Your ticket: Ångström, 2nd position → A harp',
      from: '"Kettle Lake Harp Week" <camps@example.test>',
      to: ['zoe@example.test'],
      envelope: { from: 'camps@example.test', to: ['zoe@example.test'] },
      messageId: sent.messageId,
      attachments: 2,
    });
    const { body: message } = await api<Message>('GET', `messages/${summary?.id}`);
    expect(message.text?.trim()).toBe('Bring the A harp.');
    expect(message.html).toContain('src="cid:qr@combwood"');
    expect(message.parts.map(({ filename, contentType, cid }) => [filename, contentType, cid])).toEqual([
      ['qr.png', 'image/png', 'qr@combwood'],
      ['packing – öäü.pdf', 'application/pdf', null],
    ]);
    const picture = await fetch(mail.url + message.parts[0]?.url);
    expect(picture.headers.get('content-type')).toBe('image/png');
    expect(Buffer.from(await picture.arrayBuffer()).equals(png)).toBe(true);
    const pdf = await fetch(mail.url + message.parts[1]?.url);
    // RFC 8187: the name in UTF-8, percent-encoded.
    expect(pdf.headers.get('content-disposition')).toBe(
      `attachment; filename="packing _ ___.pdf"; filename*=UTF-8''packing%20%E2%80%93%20%C3%B6%C3%A4%C3%BC.pdf`,
    );
    const raw = await (await fetch(`${mail.url}/api/messages/${message.id}/raw`)).text();
    expect(raw).toContain(`Message-ID: ${sent.messageId}`);
    expect((await fetch(`${mail.url}/api/messages/${message.id}/parts/9`)).status).toBe(404);
    expect((await fetch(`${mail.url}/api/messages/nothing`)).status).toBe(404);
  });

  test('it is found by recipient, blind copies too, newest first', async () => {
    await send({ subject: 'first' });
    await send({
      subject: 'second',
      to: { name: '', address: 'ana@example.test' },
      bcc: { name: '', address: 'kim@example.test' },
    });
    expect((await messages()).map(({ subject }) => subject)).toEqual(['second', 'first']);
    expect((await messages('?to=ZOE@')).map(({ subject }) => subject)).toEqual(['first']);
    expect((await messages('?to=kim@example.test')).map(({ subject }) => subject)).toEqual(['second']);
    expect(await messages('?to=nobody')).toEqual([]);
  });

  test('a reader can wait for mail', async () => {
    const waiting = messages('?to=late@example.test&wait=10');
    await send({ subject: 'early' });
    await send({ subject: 'late', to: { name: '', address: 'late@example.test' } });
    expect((await waiting).map(({ subject }) => subject)).toEqual(['late']);
  });

  test('it takes a sign-in, whatever it is', async () => {
    await send({ subject: 'signed in' }, { auth: { user: 'anyone', pass: 'anything' } });
    expect(await messages()).toHaveLength(1);
  });

  test('a restart keeps the mail and its order', async () => {
    for (const subject of ['one', 'two', 'three']) await send({ subject });
    const before = await messages();
    await mail.close();
    mail = await startMailServer({ smtpPort: 0, webPort: 0, stateFolder: folder });
    expect(await messages()).toEqual(before);
  });
});

describe('a stranger’s HTML', () => {
  test('it is framed in a sandbox, without script, and loads only its own pictures', async () => {
    await send({
      html: '<script>alert(1)</script><img src="cid:qr@combwood"><img src="http://example.test/spy.png">',
      subject: '<b>bold</b>',
    });
    const [summary] = await messages();
    const page = await fetch(`${mail.url}/messages/${summary?.id}`);
    const text = await page.text();
    expect(text).toContain('&lt;b&gt;bold&lt;/b&gt;');
    expect(text).not.toContain('<script');
    expect(text).toMatch(/<iframe [^>]*sandbox="allow-popups allow-popups-to-escape-sandbox"/);
    const body = await fetch(`${mail.url}/messages/${summary?.id}/body`);
    const policy = String(body.headers.get('content-security-policy'));
    expect(policy).toContain("default-src 'none'");
    expect(policy).toContain('sandbox allow-popups allow-popups-to-escape-sandbox');
    expect(policy).not.toContain('script-src');
    expect(await body.text()).toContain(`<img src="/api/messages/${summary?.id}/parts/0">`);
  });

  test('an HTML or SVG attachment is saved, never shown', async () => {
    await send({
      attachments: [{ filename: 'x.svg', content: '<svg onload="alert(1)"/>', contentType: 'image/svg+xml' }],
    });
    const [summary] = await messages();
    const part = await fetch(`${mail.url}/api/messages/${summary?.id}/parts/0`);
    expect(part.headers.get('content-disposition')).toMatch(/^attachment;/);
    expect(part.headers.get('x-content-type-options')).toBe('nosniff');
  });

  test('another site’s page and a foreign host name are kept out', async () => {
    const answer = await fetch(`${mail.url}/api/messages`, {
      method: 'DELETE',
      headers: { origin: 'http://evil.example' },
    });
    expect(answer.status).toBe(403);
  });
});

describe('faults', () => {
  test.each([
    ['mail', 421],
    ['rcpt', 450],
    ['rcpt', 550],
    ['data', 451],
    ['data', 554],
  ])('refused at %s with %i, once; then it goes through', async (step, code) => {
    await api('POST', 'faults', { step, code });
    expect(await failure(send())).toMatchObject({ responseCode: code });
    expect(await messages()).toEqual([]);
    await send();
    expect(await messages()).toHaveLength(1);
  });

  test('for one recipient only', async () => {
    await api('POST', 'faults', { step: 'rcpt', code: 550, to: 'bad@', count: 5 });
    await send();
    expect(await failure(send({ to: { name: '', address: 'bad@example.test' } }))).toMatchObject({
      responseCode: 550,
    });
  });

  test('cut after the message was taken: kept here, and the sender does not know', async () => {
    await api('POST', 'faults', { kind: 'cut', step: 'data' });
    expect(await failure(send())).toMatchObject({
      code: expect.stringMatching(/ECONNECTION|ESOCKET|ECONNRESET/),
    });
    expect(await messages()).toHaveLength(1);
  });

  test('a fault that is none is refused with the reason', async () => {
    const { status, body } = await api('POST', 'faults', { step: 'lunch', code: 200 });
    expect(status).toBe(400);
    expect(String(body.error)).toContain('step');
  });
});
