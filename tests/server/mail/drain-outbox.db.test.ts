import { eq } from 'drizzle-orm';
import type { SendMailOptions } from 'nodemailer';
import { beforeEach, expect, test } from 'vitest';
import { audit } from '@/db/schema/audit';
import { mail } from '@/db/schema/mail';
import { inTransaction } from '@/lib/server/db';
import { drainOutbox } from '@/lib/server/mail/drain-outbox';
import { enqueueMail } from '@/lib/server/mail/enqueue-mail';
import { leaseMail } from '@/lib/server/mail/lease-mail';
import { buildCamp, NOW } from '@/tests/builders/build-camp';
import { buildOrder } from '@/tests/builders/build-order';
import { useTestDatabase } from '@/tests/setup/test-database';

const at = useTestDatabase();
const HOUR = 3_600_000;
const DOWN = Object.assign(new Error('connect ECONNREFUSED'), { code: 'ESOCKET', command: 'CONN' });
const NO_SUCH_BOX = Object.assign(new Error('550 no'), {
  code: 'EENVELOPE',
  responseCode: 550,
  command: 'RCPT TO',
});

/** A mail server of the imagination: keeps what it takes, fails where told. */
let sent: SendMailOptions[] = [];
let fail: (message: SendMailOptions) => Error | null = () => null;
const send = async (message: SendMailOptions) => {
  const error = fail(message);
  if (error) throw error;
  sent.push(message);
};
const drain = (now: number) => drainOutbox(now, { send, jitter: () => 0.5 });
const rows = () => at.db.select().from(mail).orderBy(mail.id).all();
const queue = (payload: Record<string, string>, toEmail = 'noor@example.test', now = NOW) =>
  inTransaction((tx) => enqueueMail(tx, { kind: 'verify', toName: 'Noor', toEmail, payload, now }));

beforeEach(() => {
  sent = [];
  fail = () => null;
});

test('what is due goes out once, and its token is kept nowhere', async () => {
  queue({ token: 'secret' });
  queue({ token: 'later' }, 'later@example.test', NOW + HOUR);
  expect(await drain(NOW)).toBe(1);
  expect(sent).toHaveLength(1);
  expect(rows()[0]).toMatchObject({ state: 'sent', sentAt: NOW, payload: {}, leasedUntil: null });
  expect(await drain(NOW)).toBe(0);
  expect(sent).toHaveLength(1);
});

test('a mail server that is down for a day loses nothing, and is asked gently', async () => {
  for (let count = 0; count < 5; count += 1) queue({ token: `t${count}` }, `p${count}@example.test`);
  let asked = 0;
  fail = () => {
    asked += 1;
    return DOWN;
  };
  for (let now = NOW; now < NOW + 24 * HOUR; now += 5 * 60_000) await drain(now);
  expect(rows().every(({ state }) => state === 'queued')).toBe(true);
  // With waits that reach an hour, each letter is tried some 35 times in a day, not in each of the 288 rounds.
  expect(asked).toBeGreaterThan(5 * 24);
  expect(asked).toBeLessThan(5 * 50);
  fail = () => null;
  for (let now = NOW + 24 * HOUR; now < NOW + 26 * HOUR; now += 5 * 60_000) await drain(now);
  expect(new Set(sent.map(({ to }) => JSON.stringify(to))).size).toBe(5);
  expect(sent).toHaveLength(5);
  expect(rows().every(({ state }) => state === 'sent')).toBe(true);
});

test('a crash between send and mark sends it once more, as the same letter', async () => {
  queue({ token: 'abc' });
  // The process dies after the server took it: the row is leased and never marked.
  const row = leaseMail(NOW);
  expect(row?.attempts).toBe(1);
  expect(await drain(NOW + 1000)).toBe(0);
  expect(await drain(NOW + 5 * 60_000)).toBe(1);
  queue({ token: 'def' });
  let first: string | undefined;
  await drainOutbox(NOW + 6 * 60_000, {
    send: async (message) => {
      first = String(message.messageId);
      throw Object.assign(new Error('cut after data'), { code: 'ESOCKET', command: 'DATA' });
    },
    jitter: () => 0,
  });
  await drain(NOW + 20 * 60_000);
  expect(sent.at(-1)?.messageId).toBe(first);
  expect(first).toMatch(/^<mail_[0-9a-z]+@[a-z.]+>$/);
});

test('a poison row does not hold up the others, is tried eight times, and then waits for a person', async () => {
  queue({}, 'poison@example.test');
  for (let count = 0; count < 3; count += 1) queue({ token: `t${count}` }, `p${count}@example.test`);
  expect(await drain(NOW)).toBe(3);
  for (let now = NOW; now < NOW + 12 * HOUR; now += 10 * 60_000) await drain(now);
  const poison = rows().find(({ toEmail }) => toEmail === 'poison@example.test');
  expect(poison).toMatchObject({ state: 'failed', attempts: 8, lastError: 'The payload has no token' });
});

test('an address refused for good fails at once and the organiser is told, without the address', async () => {
  buildCamp(at.db);
  buildOrder(at.db);
  inTransaction((tx) =>
    enqueueMail(tx, {
      kind: 'booking-link',
      toName: 'Noor',
      toEmail: 'gone@example.test',
      payload: { orderId: 'ord_1' },
      now: NOW,
    }),
  );
  queue({ token: 'abc' });
  fail = ({ to }) => (JSON.stringify(to).includes('gone@') ? NO_SUCH_BOX : null);
  expect(await drain(NOW)).toBe(1);
  expect(
    rows()
      .map(({ state }) => state)
      .sort(),
  ).toEqual(['failed', 'sent']);
  const [note] = at.db.select().from(audit).where(eq(audit.action, 'mail.undelivered')).all();
  expect(note).toMatchObject({ organisationId: 'org_1', campId: 'cmp_1', actorUserId: null });
  expect(note?.sentence).toContain('HARP2221');
  expect(JSON.stringify(note)).not.toContain('gone@');
});

test('a wrong password at the mail server is no reason to give a letter up', async () => {
  queue({ token: 'abc' });
  fail = () => Object.assign(new Error('535'), { code: 'EAUTH', responseCode: 535, command: 'AUTH PLAIN' });
  for (let now = NOW; now < NOW + 48 * HOUR; now += 10 * 60_000) await drain(now);
  expect(rows()[0]?.state).toBe('queued');
});

test('two drains at once send each letter once', async () => {
  for (let count = 0; count < 12; count += 1) queue({ token: `t${count}` }, `p${count}@example.test`);
  const counts = await Promise.all([drain(NOW), drain(NOW), drain(NOW)]);
  expect(counts.reduce((sum, count) => sum + count, 0)).toBe(12);
  expect(new Set(sent.map(({ messageId }) => messageId)).size).toBe(12);
  expect(sent).toHaveLength(12);
});
