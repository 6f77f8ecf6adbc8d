import { expect, test } from 'vitest';
import { inTransaction } from '@/lib/server/db';
import { loadOrder, type OrderView } from '@/lib/server/orders/load-order';
import { drawable, familiesFor } from '@/lib/server/pdf/pdf-fonts';
import { issueTicket } from '@/lib/server/tickets/issue-ticket';
import { ticketPdf } from '@/lib/server/tickets/ticket-pdf';
import { buildCamp, NOW } from '@/tests/builders/build-camp';
import { buildOrder } from '@/tests/builders/build-order';
import { useTestDatabase } from '@/tests/setup/test-database';

const at = useTestDatabase();

function viewWith(attendees: string[]): OrderView {
  buildCamp(at.db);
  const { registrationIds } = buildOrder(at.db, { attendees });
  for (const registrationId of registrationIds)
    inTransaction((tx) => issueTicket(tx, { registrationId, campId: 'cmp_1', now: NOW }));
  const view = loadOrder('ord_1');
  if (!view) throw new Error('no order');
  return view;
}
const pages = (pdf: Buffer | null) => pdf?.toString('latin1').match(/\/Type \/Page\b/g)?.length;

const NAMES = [
  'Łukasz Ősz Çelik',
  'Nguyễn Thị Hương',
  'Юлия Щербак',
  'Ελένη Παππά',
  'नीरजा शर्मा',
  'نور حداد',
  'יעל כהן',
  'สมชาย คำ',
  '王小明 김민준 やまだ',
  'Նարե ნინო 𠮷野家 🎶',
  '<b>Noor</b> & "x"',
  'a\u202eb\u0007c',
  'W'.repeat(120),
];

test('a page for each attendee, in any script, however odd the name', async () => {
  const pdf = await ticketPdf(viewWith(NAMES));
  expect(pdf?.subarray(0, 5).toString()).toBe('%PDF-');
  expect(pages(pdf)).toBe(NAMES.length);
});

test('only the asked one, and nothing without a valid ticket', async () => {
  const view = viewWith(['Noor Haddad', 'Zoë Ademi']);
  expect(pages(await ticketPdf(view, 'reg_1b'))).toBe(1);
  const none = { ...view, registrations: view.registrations.map((person) => ({ ...person, ticket: null })) };
  expect(await ticketPdf(none)).toBeNull();
});

test('each letter has a face that draws it; the big last one is read only where nothing else does', () => {
  expect(familiesFor('Noor Haddad')).toEqual(['Latin']);
  expect(familiesFor('Łukasz')).toContain('LatinExt');
  expect(familiesFor('نور')).toContain('Arabic');
  for (const name of NAMES.slice(0, 8)) expect(familiesFor(drawable(name))).not.toContain('Unifont');
  for (const name of NAMES.slice(8, 10)) expect(familiesFor(drawable(name))).toContain('Unifont');
  expect(drawable('𠮷a\u202eb\u0007')).toBe('□a b ');
});
