import ICAL from 'ical.js';
import { beforeEach, describe, expect, test, vi } from 'vitest';
import {
  mailPackingListAction,
  saveOwnHarpsAction,
} from '@/app/(public)/my/registrations/[registrationId]/packing-list/actions';
import { GET as getReceipt } from '@/app/api/my/orders/[orderId]/receipts/[number]/route';
import { GET as getTickets } from '@/app/api/my/orders/[orderId]/tickets/route';
import { GET as getCalendar } from '@/app/api/my/registrations/[registrationId]/calendar/route';
import { GET as getTicket } from '@/app/api/my/registrations/[registrationId]/ticket/route';
import { mail } from '@/db/schema/mail';
import { payment, receipt } from '@/db/schema/money';
import { registrationHarp } from '@/db/schema/order';
import { meeting } from '@/db/schema/workshop';
import { minor } from '@/lib/domain/shared/money';
import { type Granted, orderProof, ordersCookieName } from '@/lib/server/auth/order-grants';
import { inTransaction } from '@/lib/server/db';
import { loadAttendee } from '@/lib/server/packing/load-attendee';
import { issueTicket } from '@/lib/server/tickets/issue-ticket';
import { buildCamp, NOW } from '@/tests/builders/build-camp';
import { buildOrder } from '@/tests/builders/build-order';
import { buildWorkshop } from '@/tests/builders/build-workshop';
import { fakeRequest, useFakeRequest } from '@/tests/setup/fake-request';
import { useTestDatabase } from '@/tests/setup/test-database';

vi.mock('next/headers', async () => (await import('@/tests/setup/fake-request')).nextHeaders);
vi.mock('next/cache', async () => (await import('@/tests/setup/fake-request')).nextCache);

const at = useTestDatabase();
useFakeRequest();
beforeEach(() => {
  buildCamp(at.db);
  const { registrationIds } = buildOrder(at.db, { attendees: ['Noor Haddad', 'Zoë Ademi'] });
  for (const registrationId of registrationIds)
    inTransaction((tx) => issueTicket(tx, { registrationId, campId: 'cmp_1', now: NOW }));
  const money = { orderId: 'ord_1', amount: minor(92_000), currency: 'EUR' } as const;
  at.db
    .insert(payment)
    .values({ ...money, id: 'pay_1', state: 'captured', createdAt: NOW, updatedAt: NOW })
    .run();
  at.db
    .insert(receipt)
    .values({ ...money, id: 'rcp_1', organisationId: 'org_1', paymentId: 'pay_1', number: 17, issuedAt: NOW })
    .run();
  const harp = { by: 'harp', labelKey: 'A', tuning: 'richter', register: 'standard' } as const;
  buildWorkshop(at.db, { id: 'wsh_1', trackIds: ['trk_1b'], needs: [{ level: 'required', anyOf: [harp] }] });
  buildWorkshop(at.db, { id: 'wsh_2', trackIds: ['trk_1a'] });
  for (const [id, workshopId] of [
    ['mtg_1', 'wsh_1'],
    ['mtg_2', 'wsh_2'],
  ] as const)
    at.db
      .insert(meeting)
      .values({
        ...{ id, workshopId, campId: 'cmp_1', roomId: 'rom_1a', day: '2026-06-08', starts: '09:30' },
        ...{ lengthMinutes: 75, updatedAt: NOW },
      })
      .run();
});

const grant = (...ids: Granted[]) =>
  fakeRequest.jar.set(ordersCookieName(), ids.map((id) => `${id}.${orderProof(id)}`).join(' '));
const ask = (get: typeof getTickets, params: Record<string, string>) =>
  get(new Request('http://localhost:3000/x'), { params: Promise.resolve(params) });

describe('files of a booking', () => {
  const DOORS: [string, typeof getTickets, Record<string, string>, string][] = [
    ['all tickets', getTickets, { orderId: 'ord_1' }, 'application/pdf'],
    ['a receipt', getReceipt, { orderId: 'ord_1', number: '17' }, 'application/pdf'],
    ['one ticket', getTicket, { registrationId: 'reg_1a' }, 'application/pdf'],
    ['a timetable', getCalendar, { registrationId: 'reg_1a' }, 'text/calendar; charset=utf-8'],
  ];

  test.each(DOORS)('%s: for the payer, never kept by a cache', async (_, get, params, type) => {
    grant('ord_1');
    const answer = await ask(get, params);
    expect(answer.status).toBe(200);
    expect(answer.headers.get('content-type')).toBe(type);
    expect(answer.headers.get('cache-control')).toBe('private, no-store');
    expect(answer.headers.get('content-disposition')).toMatch(
      /^attachment; filename="[A-Za-z0-9-]+\.(pdf|ics)"$/,
    );
    const body = Buffer.from(await answer.arrayBuffer());
    expect(body.subarray(0, 5).toString()).toBe(type === 'application/pdf' ? '%PDF-' : 'BEGIN');
  });

  test.each(DOORS)('%s: not there for a stranger or another booking', async (_, get, params) => {
    expect((await ask(get, params)).status).toBe(404);
    buildOrder(at.db, { id: 'ord_2' });
    grant('ord_2', 'reg_2a');
    expect((await ask(get, params)).status).toBe(404);
  });

  test('an attendee gets their own ticket and timetable, not the order, its receipt or another attendee', async () => {
    grant('reg_1b');
    expect((await ask(getTicket, { registrationId: 'reg_1b' })).status).toBe(200);
    expect((await ask(getCalendar, { registrationId: 'reg_1b' })).status).toBe(200);
    expect((await ask(getTicket, { registrationId: 'reg_1a' })).status).toBe(404);
    expect((await ask(getTickets, { orderId: 'ord_1' })).status).toBe(404);
    expect((await ask(getReceipt, { orderId: 'ord_1', number: '17' })).status).toBe(404);
  });

  test('a receipt of another order is not there, whatever its number', async () => {
    buildOrder(at.db, { id: 'ord_2' });
    grant('ord_2');
    expect((await ask(getReceipt, { orderId: 'ord_2', number: '17' })).status).toBe(404);
  });

  test('the timetable holds one’s own meetings only (RFC 5545, read by another library)', async () => {
    grant('reg_1a');
    const text = await (await ask(getCalendar, { registrationId: 'reg_1a' })).text();
    const events = new ICAL.Component(ICAL.parse(text)).getAllSubcomponents('vevent');
    expect(events.map((event) => event.getFirstPropertyValue('uid'))).toEqual(['mtg_1@combwood']);
  });
});

describe('harps one owns', () => {
  const save = (fields: Record<string, string | string[]>) => {
    const form = new FormData();
    for (const [name, values] of Object.entries(fields))
      for (const value of [values].flat()) form.append(name, value);
    return saveOwnHarpsAction(null, form);
  };
  const sources = () => loadAttendee('reg_1a')?.packing.lines.map(({ label, source }) => [label, source]);

  test('change the packing list at once', async () => {
    grant('reg_1a');
    expect(sources()).toEqual([['A', 'bring']]);
    const answer = await save({
      registrationId: 'reg_1a',
      harpIds: ['C-richter-standard', 'A-richter-standard'],
    });
    expect(answer?.status).toBe('success');
    expect(sources()).toEqual([['A', 'owned']]);
    await save({ registrationId: 'reg_1a' });
    expect(sources()).toEqual([['A', 'bring']]);
  });

  test('take one more by key, tuning and register; a button without a key says so and loses nothing', async () => {
    grant('reg_1a');
    const lists = { addTuning: 'natural-minor', addRegister: 'standard', intent: 'add' };
    await save({ registrationId: 'reg_1a', addKey: 'G', ...lists });
    // Published label convention: a natural minor labelled Gm has C on hole 1.
    expect(at.db.select().from(registrationHarp).all()).toEqual([
      { registrationId: 'reg_1a', harpId: 'C-natural-minor-standard' },
    ]);
    const answer = await save({ registrationId: 'reg_1a', addKey: '', ...lists });
    expect(answer?.error?.addKey).toEqual(['Choose the key of the harp to add.']);
    expect(at.db.select().from(registrationHarp).all()).toHaveLength(1);
  });

  test.each([['H-richter-standard'], ['<script>'], ['C-richter-standard; drop table']])(
    'refuse what is no harp: %s',
    async (harpIds) => {
      grant('reg_1a');
      expect((await save({ registrationId: 'reg_1a', harpIds }))?.status).toBe('error');
      expect(at.db.select().from(registrationHarp).all()).toEqual([]);
    },
  );

  test('are nobody else’s to change', async () => {
    grant('reg_1b');
    expect((await save({ registrationId: 'reg_1a', harpIds: 'A-richter-standard' }))?.status).toBe('error');
    expect(at.db.select().from(registrationHarp).all()).toEqual([]);
  });
});

test('a packing list is mailed to the attendee, whoever asks; an unpaid one is not', async () => {
  const press = (registrationId: string) => {
    const form = new FormData();
    form.set('registrationId', registrationId);
    return mailPackingListAction(null, form);
  };
  buildOrder(at.db, { id: 'ord_3', state: 'held' });
  grant('ord_1', 'ord_3');
  expect((await press('reg_1b'))?.status).toBe('success');
  expect(at.db.select().from(mail).all()).toMatchObject([
    { kind: 'packing-list', toEmail: 'b@example.test' },
  ]);
  expect((await press('reg_3a'))?.status).toBe('error');
  expect(at.db.select().from(mail).all()).toHaveLength(1);
});
