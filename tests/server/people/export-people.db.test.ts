import Papa from 'papaparse';
import { beforeEach, expect, test } from 'vitest';
import { audit } from '@/db/schema/audit';
import { registrationNeeds } from '@/db/schema/order';
import { ALL_PEOPLE } from '@/lib/domain/people/people-query';
import { exportPeople } from '@/lib/server/people/export-people';
import { buildCamp, NOW } from '../../builders/build-camp';
import { buildCrowd } from '../../builders/build-crowd';
import { buildOrder } from '../../builders/build-order';
import { staff } from '../../builders/staff';
import { recordStatements } from '../../setup/record-statements';
import { useTestDatabase } from '../../setup/test-database';

const at = useTestDatabase();
let ids: ReturnType<typeof buildCamp>;
beforeEach(() => {
  ids = buildCamp(at.db);
});
const text = async (query = {}) =>
  new Response(
    exportPeople(
      { id: ids.campId, organisationId: ids.organisationId, timeZone: 'Europe/Berlin' },
      { ...ALL_PEOPLE, ...query },
      { actor: staff('treasurer'), now: NOW },
    ),
  );

/** Read back by another library than the one that wrote it. */
async function read(query = {}) {
  const bytes = Buffer.from(await (await text(query)).arrayBuffer());
  const parsed = Papa.parse<Record<string, string>>(bytes.toString('utf8'), {
    header: true,
    skipEmptyLines: true,
  });
  expect(parsed.errors).toEqual([]);
  return parsed.data;
}

// OWASP ASVS 5.0, 1.2.10: a leading = + - @ tab (and a carriage return) makes a spreadsheet run the cell.
test.each([
  '=HYPERLINK("http://evil.example","Click")',
  "=cmd|' /C calc'!A0",
  '+1+1',
  '-2+3',
  '@SUM(1+1)*cmd',
  '\t=1+1',
  '\r=1+1',
])('ASVS 1.2.10: the name %j is written with an apostrophe before it', async (name) => {
  buildOrder(at.db, { attendees: [name], payer: { payerName: name } });
  const [row] = await read();
  expect(row?.Name).toBe(`'${name}`);
  expect(row?.Payer).toBe(`'${name}`);
});

// RFC 4180, section 2: CRLF after each record, quotes doubled, commas and line breaks inside quotes.
test('quotes, commas, line breaks and scripts come back as they were', async () => {
  const names = ['Ann "Reed" O’Hara, Jr.', 'two\nlines', 'Łukasz 美咲 Ødegård', '<b>bold</b>', '1-2'];
  buildOrder(at.db, { attendees: names });
  const bytes = Buffer.from(await (await text()).arrayBuffer());
  expect([...bytes.subarray(0, 3)]).toEqual([0xef, 0xbb, 0xbf]);
  expect(bytes.toString('utf8')).toContain('"Ann ""Reed"" O’Hara, Jr."');
  expect(bytes.toString('utf8').replaceAll('"two\nlines"', '')).not.toMatch(/[^\r]\n/);
  expect((await read()).map((row) => row.Name).sort()).toEqual([...names].sort());
});

test('money is plain, in the currency’s own digits, and never begins with a minus', async () => {
  buildOrder(at.db);
  expect((await read())[0]).toMatchObject({
    Currency: 'EUR',
    'Order total': '460.00',
    'Order paid': '0.00',
    'Order still to pay': '0.00',
    'Order to give back': '0.00',
    'Registered (Europe/Berlin)': '2026-05-01 11:00',
  });
});

test('holds all pages of what was asked for, nothing of health, and leaves a note of who took it', async () => {
  buildCrowd(at.db, 130, { trackIds: [ids.beginners] });
  at.db
    .insert(registrationNeeds)
    .values({ registrationId: 'reg_00001', diet: 'SECRET-DIET', emergencyName: 'SECRET-NAME' })
    .run();
  expect(await read()).toHaveLength(130);
  expect(await read({ state: 'held' })).toHaveLength(26);
  expect(await (await text()).text()).not.toContain('SECRET');
  expect(
    at.db
      .select()
      .from(audit)
      .all()
      .map(({ sentence }) => sentence),
  ).toContain('Exported a list of 130 people.');
});

test('as many statements for a crowd as for one', async () => {
  buildOrder(at.db);
  const statements = async (): Promise<number> => {
    const seen = recordStatements(at.db);
    await (await text()).text();
    seen.stop();
    return seen.executed.length;
  };
  const few = await statements();
  expect(few).toBeGreaterThan(0);
  buildCrowd(at.db, 500, { trackIds: [ids.beginners] });
  expect(await statements()).toBe(few);
});
