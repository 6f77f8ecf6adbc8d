import { beforeEach, expect, test, vi } from 'vitest';
import { askForLinkAction } from '@/app/(public)/my/actions';
import { mail } from '@/db/schema/mail';
import { sendBookingLink } from '@/lib/server/orders/send-booking-link';
import { buildCamp, NOW } from '@/tests/builders/build-camp';
import { buildOrder } from '@/tests/builders/build-order';
import { useFakeRequest } from '@/tests/setup/fake-request';
import { useTestDatabase } from '@/tests/setup/test-database';

vi.mock('next/headers', async () => (await import('@/tests/setup/fake-request')).nextHeaders);

const at = useTestDatabase();
useFakeRequest();
beforeEach(() => {
  buildCamp(at.db);
  buildOrder(at.db);
});
const ask = (fields: Record<string, string>) => {
  const form = new FormData();
  for (const [name, value] of Object.entries(fields)) form.set(name, value);
  return askForLinkAction(null, form);
};
const mails = () => at.db.select().from(mail).all();

// ASVS 6.3.8: who asks learns nothing of who has booked.
test('the answer is the same for a right and a wrong pair; only the right one is mailed, to the address on record', async () => {
  const right = await ask({ email: ' NOOR@example.test ', reference: 'harp-2221' });
  const wrong = await ask({ email: 'noor@example.test', reference: 'HARP9999' });
  const other = await ask({ email: 'thief@example.test', reference: 'HARP2221' });
  for (const answer of [right, wrong, other]) expect(answer).toMatchObject({ status: 'success' });
  expect(Object.keys(wrong ?? {})).toEqual(Object.keys(right ?? {}));
  expect(mails()).toHaveLength(1);
  expect(mails()[0]).toMatchObject({
    kind: 'booking-link',
    toEmail: 'noor@example.test',
    payload: { orderId: 'ord_1' },
  });
});

test('asked again within ten minutes, no second mail goes out', () => {
  const given = { email: 'noor@example.test', reference: 'HARP2221' };
  sendBookingLink({ ...given, now: NOW });
  sendBookingLink({ ...given, now: NOW + 9 * 60_000 });
  expect(mails()).toHaveLength(1);
  sendBookingLink({ ...given, now: NOW + 11 * 60_000 });
  expect(mails()).toHaveLength(2);
});

test.each([
  [{ email: '', reference: '' }, ['email', 'reference']],
  [{ email: 'noor', reference: 'HARP2221' }, ['email']],
  [{ email: 'noor@example.test', reference: '<b>' }, ['reference']],
  [{ email: 'noor@example.test', reference: 'x'.repeat(500) }, ['reference']],
  [{ email: 'a@example.test\r\nBcc: b@example.test', reference: 'HARP2221' }, ['email']],
])('names the field at fault: %j', async (fields, at_fault) => {
  const answer = await ask(fields);
  expect(answer?.status).toBe('error');
  expect(Object.keys(answer?.error ?? {}).sort()).toEqual(at_fault);
  expect(mails()).toHaveLength(0);
});
