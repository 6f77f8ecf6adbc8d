import { eq } from 'drizzle-orm';
import { type ParsedMail, simpleParser } from 'mailparser';
import { afterAll, beforeAll, beforeEach, expect, test } from 'vitest';
import { MAIL_KINDS, type MailKind, mail } from '@/db/schema/mail';
import { payment, refund } from '@/db/schema/money';
import { minor } from '@/lib/domain/shared/money';
import { parseTicket } from '@/lib/domain/tickets/ticket-token';
import { isOrderProof } from '@/lib/server/auth/order-grants';
import { inTransaction } from '@/lib/server/db';
import { drainOutbox } from '@/lib/server/mail/drain-outbox';
import { enqueueMail } from '@/lib/server/mail/enqueue-mail';
import { closeTransport } from '@/lib/server/mail/transport';
import { issueTicket } from '@/lib/server/tickets/issue-ticket';
import { verifyTicket } from '@/lib/server/tickets/verify-ticket';
import { buildCamp, NOW } from '@/tests/builders/build-camp';
import { buildOrder } from '@/tests/builders/build-order';
import { readCode } from '@/tests/setup/read-code';
import { receiveMails } from '@/tests/setup/receive-mails';
import { useTestDatabase } from '@/tests/setup/test-database';

const at = useTestDatabase();
const server = receiveMails();
beforeAll(() => server.start());
afterAll(async () => {
  closeTransport();
  await server.stop();
});

const ATTENDEES = ['Noor Haddad', 'نور حداد', '王小明'];
beforeEach(() => {
  buildCamp(at.db);
  const { registrationIds } = buildOrder(at.db, { attendees: ATTENDEES });
  for (const registrationId of registrationIds)
    inTransaction((tx) => issueTicket(tx, { registrationId, campId: 'cmp_1', now: NOW }));
  const money = {
    orderId: 'ord_1',
    amount: minor(46_000),
    currency: 'EUR',
    createdAt: NOW,
    updatedAt: NOW,
  } as const;
  at.db
    .insert(payment)
    .values({ ...money, id: 'pay_1', state: 'captured' })
    .run();
  at.db
    .insert(refund)
    .values({
      ...money,
      id: 'rfd_1',
      paymentId: 'pay_1',
      state: 'owed',
      reason: 'Paid twice',
      nextAttemptAt: NOW,
    })
    .run();
});

const PAYLOADS: Record<MailKind, Record<string, string>> = {
  verify: { token: 'tok-verify' },
  'known-address': {},
  reset: { token: 'tok-reset' },
  'account-changed': { change: 'password' },
  invite: {
    token: 'tok',
    organisationName: 'Slate Ridge Harp Society',
    role: 'door',
    invitedBy: 'Ana Teixeira',
  },
  'order-confirmed': { orderId: 'ord_1' },
  'packing-list': { registrationId: 'reg_1a' },
  'late-payment': { orderId: 'ord_1', refundId: 'rfd_1', reason: 'Paid twice' },
  'booking-link': { orderId: 'ord_1' },
};

/** Through the outbox, nodemailer and SMTP, and read back by another program. */
async function post(
  kind: MailKind,
  toName = 'Noor Haddad',
  toEmail = 'noor@example.test',
): Promise<{ raw: string; read: ParsedMail; to: string[] }> {
  inTransaction((tx) => enqueueMail(tx, { kind, toName, toEmail, payload: PAYLOADS[kind], now: NOW }));
  await drainOutbox(NOW);
  const row = at.db.select().from(mail).where(eq(mail.kind, kind)).get();
  if (row?.state !== 'sent') throw new Error(`${kind}: ${row?.lastError}`);
  const { raw, to } = server.take();
  return { raw, to, read: await simpleParser(raw, { skipImageLinks: true }) };
}
const urls = (text: string) => [...text.matchAll(/https?:\/\/[^\s<>"']+/g)].map(([url]) => url);

test.each(MAIL_KINDS)(
  '%s: one link, a text part that says the same, no line too long, nothing fetched',
  async (kind) => {
    const { raw, read, to } = await post(kind);
    expect(to).toEqual(['noor@example.test']);
    expect(read.messageId).toMatch(/^<mail_[0-9a-z]+@slateridge\.example>$/);
    // RFC 3834
    expect(read.headers.get('auto-submitted')).toBe('auto-generated');
    const html = String(read.html);
    const text = read.text ?? '';
    expect(text.length).toBeGreaterThan(100);
    expect([...html.matchAll(/<a [^>]*href="([^"]+)"/g)]).toHaveLength(1);
    expect(urls(text)).toHaveLength(1);
    const [link] = [...html.matchAll(/<a [^>]*href="([^"]+)"/g)].map((found) =>
      found[1]?.replaceAll('&amp;', '&'),
    );
    expect(urls(text)[0]).toBe(link);
    for (const [, source = ''] of html.matchAll(/(?:src|background)="([^"]*)"/g))
      expect(source).toMatch(/^cid:/);
    expect(html).not.toMatch(/@import|url\(|<script|<link/i);
    // RFC 5322, 2.1.1: at most 998 characters a line.
    expect(Math.max(...raw.split('\r\n').map((line) => line.length))).toBeLessThanOrEqual(998);
    expect(raw).not.toMatch(/[^\r]\n/);
  },
);

// RFC 2047 and RFC 5322: the name comes back as it was, and stays one recipient (ASVS 1.3.11).
test.each([
  'André Ōsawa',
  '王小明',
  'نور حداد',
  'Haddad, Noor',
  'O\'Neill "Reed" <x@example.test>',
  'a@example.test, b@example.test',
  '🎶 Ana',
])('a name is a name: %s', async (name) => {
  const { read, to } = await post('verify', name);
  expect(to).toEqual(['noor@example.test']);
  const header = Array.isArray(read.to) ? read.to[0] : read.to;
  expect(header?.value).toEqual([{ name, address: 'noor@example.test' }]);
});

test('a name with line breaks adds no header and no recipient', async () => {
  const { raw, read, to } = await post('verify', 'Noor\r\nBcc: thief@example.test\r\n\r\nHello');
  expect(to).toEqual(['noor@example.test']);
  expect(read.bcc).toBeUndefined();
  expect(raw).not.toMatch(/^Bcc:/im);
});

test('markup in a name stays text', async () => {
  const { read } = await post('verify', '<img src=x onerror=alert(1)><b>Noor</b>');
  expect(String(read.html)).not.toContain('<img src=x');
  expect(read.text).toContain('<img src=x onerror=alert(1)><b>Noor</b>');
});

test('RFC 2047, section 8: the parser itself reads the example', async () => {
  const read = await simpleParser('From: =?ISO-8859-1?Q?Andr=E9?= Pirard <p@example.test>\r\n\r\nx');
  expect(read.from?.value[0]?.name).toBe('André Pirard');
});

test('the tickets: each code by a cid that exists once, read back, verified; PDF and link beside it', async () => {
  const { raw, read } = await post('order-confirmed');
  const inline = read.attachments.filter(({ related }) => related);
  expect(inline).toHaveLength(ATTENDEES.length);
  // RFC 2392: each cid: URL names exactly one Content-ID.
  const named = [...String(read.html).matchAll(/src="cid:([^"]+)"/g)].map((found) => found[1] ?? '');
  expect(named).toHaveLength(ATTENDEES.length);
  expect(new Set(named).size).toBe(ATTENDEES.length);
  for (const cid of named)
    expect(raw.match(new RegExp(`^Content-ID: <${cid.replaceAll('.', '\\.')}>\r?$`, 'gim'))).toHaveLength(1);
  const tickets = new Set<string>();
  for (const { content } of inline) {
    const text = await readCode(content);
    expect(verifyTicket(text)).toMatchObject({ campId: 'cmp_1' });
    tickets.add(parseTicket(text)?.ticketId ?? '');
  }
  expect(tickets.size).toBe(ATTENDEES.length);
  const pdf = read.attachments.find(({ contentType }) => contentType === 'application/pdf');
  expect(pdf?.content.subarray(0, 5).toString()).toBe('%PDF-');
  expect(pdf?.filename).toBe('tickets-HARP2221.pdf');
  const [, orderId, key] = /\/o\/(ord_\w+)\?key=([\w-]+)/.exec(read.text ?? '') ?? [];
  expect(orderId).toBe('ord_1');
  expect(isOrderProof('ord_1', key ?? '')).toBe(true);
  for (const name of ATTENDEES) expect(read.text).toContain(name);
  expect(read.text).toContain('Until 60 days before: all but 50 EUR.');
});

test('answers to letters about a camp go to its organiser', async () => {
  const { read } = await post('packing-list');
  expect(read.replyTo?.value).toEqual([
    { name: 'Slate Ridge Harp Society', address: 'office@slateridge.example' },
  ]);
});
