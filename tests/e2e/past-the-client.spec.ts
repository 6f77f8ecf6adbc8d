import { randomUUID } from 'node:crypto';
import { expect, test } from '@playwright/test';
import { signWebhook } from '../fakes/stripe/sign-webhook';
import { DEMO_SECRETS } from '../setup/demo-secrets.mjs';
import { readForm, sendForm } from './raw-form';
import { makeCookies, openRows, SENDERS, type Sender } from './role-cookies';

// Requests that no page of ours would send (ASVS 5.0, 2.2.2), and the answer that each must get.
const OWN = 'cmp_demob';
const OTHER_OF_OWN = 'cmp_demoa';
const FOREIGN = 'cmp_second';
const base = () => process.env.E2E_APP_URL ?? 'http://localhost:3000';

let cookies: Record<Sender, string>;
let own: { registrationId: string; orderId: string };
test.beforeAll(() => {
  cookies = makeCookies();
  const db = openRows();
  own = db
    .prepare(
      `select r.id as registrationId, r.order_id as orderId from registration r join "order" o on o.id = r.order_id
       where r.camp_id = ? and r.state = 'confirmed' and o.payer_email <> 'oskar@players.example'
       and r.attendee_email <> 'oskar@players.example' order by r.id limit 1`,
    )
    .get(OWN) as typeof own;
  db.close();
});

const ask = (path: string, sender: Sender, init: RequestInit = {}) =>
  fetch(base() + path, {
    redirect: 'manual',
    ...init,
    headers: { cookie: cookies[sender], ...(init.headers as Record<string, string>) },
  });
const scan = (
  campId: string,
  sender: Sender,
  headers: Record<string, string> = { origin: base() },
  body?: string,
) =>
  ask(`/api/door/${campId}/scans`, sender, {
    method: 'POST',
    headers: { 'content-type': 'application/json', ...headers },
    body: body ?? JSON.stringify({ kind: 'ticket', id: randomUUID(), deviceAt: 0, code: 'not a ticket' }),
  });

// A role that falls short in one's own organisation is 403; what is somebody else's looks like what is not there.
const nobody = {
  visitor: 401,
  attendee: 404,
  door: 404,
  instructor: 404,
  treasurer: 404,
  organiser: 404,
  second: 404,
};
const people = { ...nobody, door: 403, instructor: 403, treasurer: 200, organiser: 200 };
const door = { ...nobody, door: 200, instructor: 403, treasurer: 403, organiser: 200 };
const stranger = { ...nobody, visitor: 404 };
const theirs = (of: Record<Sender, number>) => ({ ...nobody, second: of.organiser });

const TABLE: readonly (readonly [string, (sender: Sender) => Promise<Response>, Record<Sender, number>])[] = [
  ['people', (as) => ask(`/api/organise/camps/${OWN}/people`, as), people],
  ['people of a foreign camp', (as) => ask(`/api/organise/camps/${FOREIGN}/people`, as), theirs(people)],
  ['people.csv', (as) => ask(`/api/organise/camps/${OWN}/people.csv`, as), people],
  [
    'people.csv of a foreign camp',
    (as) => ask(`/api/organise/camps/${FOREIGN}/people.csv`, as),
    theirs(people),
  ],
  ['one person', (as) => ask(`/api/organise/camps/${OWN}/people/${own.registrationId}`, as), people],
  [
    'one person under another camp of the same organisation',
    (as) => ask(`/api/organise/camps/${OTHER_OF_OWN}/people/${own.registrationId}`, as),
    { ...people, treasurer: 404, organiser: 404 },
  ],
  [
    'one person under a foreign camp',
    (as) => ask(`/api/organise/camps/${FOREIGN}/people/${own.registrationId}`, as),
    nobody,
  ],
  ['door search', (as) => ask(`/api/door/${OWN}/people?q=a`, as), door],
  ['door search of a foreign camp', (as) => ask(`/api/door/${FOREIGN}/people?q=a`, as), theirs(door)],
  ['a forged ticket', (as) => scan(OWN, as), door],
  ['a forged ticket at a foreign door', (as) => scan(FOREIGN, as), theirs(door)],
  ['tickets of a stranger’s order', (as) => ask(`/api/my/orders/${own.orderId}/tickets`, as), stranger],
  ['receipt of a stranger’s order', (as) => ask(`/api/my/orders/${own.orderId}/receipts/1`, as), stranger],
  ['ticket of a stranger', (as) => ask(`/api/my/registrations/${own.registrationId}/ticket`, as), stranger],
  [
    'calendar of a stranger',
    (as) => ask(`/api/my/registrations/${own.registrationId}/calendar`, as),
    stranger,
  ],
];

for (const [what, send, expected] of TABLE)
  test(`${what}: each role gets its own answer`, async () => {
    const got = await Promise.all(SENDERS.map(async (as) => [as, await send(as)] as const));
    expect(Object.fromEntries(got.map(([as, { status }]) => [as, status]))).toEqual(expected);
    for (const [, answer] of got) {
      expect(answer.headers.get('x-content-type-options')).toBe('nosniff');
      const type = answer.headers.get('content-type') ?? '';
      if (answer.status >= 400) expect(type).toBe('application/problem+json');
      if (!what.startsWith('a forged')) expect(answer.headers.get('cache-control')).toContain('no-store');
    }
  });

test('every staff page is closed to other roles and other organisations', async () => {
  const pages = ['', '/details', '/tracks', '/timetable', '/people', '/money', '/staff'].filter(
    (p) => p !== '/staff',
  );
  for (const path of pages)
    for (const as of ['visitor', 'attendee', 'second'] as const) {
      const answer = await ask(`/organise/camps/${OWN}${path}`, as);
      expect([path, as, answer.status]).toEqual([path, as, as === 'visitor' ? 307 : 404]);
    }
  for (const [path, as] of [
    ['/money', 'door'],
    ['/people', 'instructor'],
    ['/details', 'treasurer'],
    [`/people/${own.registrationId}/needs`, 'treasurer'],
  ] as const) {
    const answer = await ask(`/organise/camps/${OWN}${path}`, as);
    expect([path, as, [403, 404].includes(answer.status)]).toEqual([path, as, true]);
  }
});

test('an organiser’s form sent with another cookie, from elsewhere or from nowhere changes nothing', async () => {
  const form = await readForm('/organise/camps/cmp_second/details', 'Save', cookies.second);
  const read = () => {
    const db = openRows();
    const row = db.prepare("select * from camp where id = 'cmp_second'").get();
    db.close();
    return row;
  };
  const before = read();
  const values = [['name', 'Taken over']] as const;
  for (const as of SENDERS.filter((sender) => sender !== 'second')) {
    const { status, text } = await sendForm(form, values, { cookie: cookies[as] });
    expect([as, status, text.includes('1 Lake Road')]).toEqual([as, as === 'visitor' ? 307 : 404, false]);
  }
  const cookie = cookies.second;
  const forged = { 'x-forwarded-host': 'evil.example' };
  for (const sent of [
    { cookie, origin: null },
    { cookie, origin: 'null' },
    { cookie, origin: 'https://evil.example' },
    { cookie, origin: 'https://evil.example', headers: forged },
    { cookie, headers: { 'sec-fetch-site': 'cross-site' } },
  ])
    expect((await sendForm(form, values, sent)).status).not.toBe(303);
  expect(read()).toEqual(before);
});

test('a route takes no post without our own Origin, too long, or of no JSON', async () => {
  for (const [headers, body, status] of [
    [{}, undefined, 403],
    [{ origin: 'https://evil.example' }, undefined, 403],
    [{ origin: 'null' }, undefined, 403],
    [{ origin: base(), 'sec-fetch-site': 'cross-site' }, undefined, 403],
    [{ origin: base() }, 'x'.repeat(100_000), 413],
    [{ origin: base() }, '{"kind":', 400],
    [{ origin: base() }, '{"kind":"ticket","id":"1","deviceAt":-1,"code":""}', 400],
    [{ origin: base() }, '[]', 400],
  ] as const)
    expect([headers, (await scan(OWN, 'door', headers, body)).status]).toEqual([headers, status]);
});

test('a forged ticket lets nobody in', async () => {
  const arrived = () => {
    const db = openRows();
    const row = db.prepare("select count(*) as n from registration where arrival = 'arrived'").get();
    db.close();
    return row;
  };
  const before = arrived();
  const answer = await scan(OWN, 'door');
  expect(await answer.json()).toEqual({ verdict: 'not-valid', person: null, otherCamp: null });
  expect(arrived()).toEqual(before);
});

test('a webhook that is not the provider’s, or not about an order of ours, takes no money', async () => {
  const db = openRows();
  const rows = () => [
    db.prepare('select count(*) as n from ledger').get(),
    db.prepare("select count(*) as n from payment where state = 'captured'").get(),
  ];
  const paid = db
    .prepare(
      'select session_id as id, order_id as orderId, currency from payment where session_id is not null limit 1',
    )
    .get() as { id: string; orderId: string; currency: string } | undefined;
  const before = rows();
  const event = (about: object) =>
    JSON.stringify({
      id: `evt_${randomUUID()}`,
      object: 'event',
      type: 'checkout.session.completed',
      data: {
        object: {
          id: 'cs_unknown',
          object: 'checkout.session',
          status: 'complete',
          payment_status: 'paid',
          amount_total: 1,
          currency: 'usd',
          payment_intent: 'pi_unknown',
          client_reference_id: 'ord_unknown',
          metadata: {},
          ...about,
        },
      },
    });
  const send = (body: string, signature: string | null) =>
    fetch(`${base()}/api/stripe/webhook`, {
      method: 'POST',
      body,
      headers: signature === null ? {} : { 'stripe-signature': signature },
    });
  const secret = DEMO_SECRETS.STRIPE_WEBHOOK_SECRET;
  const now = Math.floor(Date.now() / 1000);
  const unknown = event({});
  expect((await send(unknown, null)).status).toBe(400);
  expect((await send(unknown, signWebhook(unknown, 'whsec_other', now))).status).toBe(400);
  expect((await send(`${unknown} `, signWebhook(unknown, secret, now))).status).toBe(400);
  expect((await send(unknown, signWebhook(unknown, secret, now - 400))).status).toBe(400);
  expect((await send(unknown, signWebhook(unknown, secret, now + 400))).status).toBe(400);
  const large = 'x'.repeat(300_000);
  expect((await send(large, signWebhook(large, secret, now))).status).toBe(413);
  const aside = await send(unknown, signWebhook(unknown, secret, now));
  expect([aside.status, await aside.json()]).toEqual([200, { outcome: 'set-aside' }]);
  if (paid) {
    const wrong = event({
      id: paid.id,
      client_reference_id: paid.orderId,
      currency: paid.currency.toLowerCase(),
    });
    const told = await send(wrong, signWebhook(wrong, secret, now));
    expect([told.status, await told.json()]).toEqual([200, { outcome: 'set-aside' }]);
  }
  expect(rows()).toEqual(before);
  db.close();
});

test('each page and route says how it may be shown, kept and framed', async () => {
  for (const [path, as] of [
    ['/', 'visitor'],
    ['/sign-in', 'visitor'],
    ['/my', 'attendee'],
    ['/account', 'attendee'],
    [`/organise/camps/${OWN}/people`, 'organiser'],
    [`/door/${OWN}`, 'door'],
    ['/nothing-here', 'visitor'],
    ['/invitations/nobody.js', 'visitor'],
  ] as const) {
    const { headers } = await ask(path, as);
    const policy = headers.get('content-security-policy') ?? '';
    for (const rule of [
      "object-src 'none'",
      "base-uri 'none'",
      "frame-ancestors 'none'",
      "script-src 'self' 'nonce-",
    ])
      expect([path, policy.includes(rule)]).toEqual([path, true]);
    expect(policy).not.toMatch(/script-src[^;]*'unsafe-(inline|eval)'/);
    expect(headers.get('cache-control')).toContain('no-store');
    expect(headers.get('referrer-policy')).toBe('strict-origin-when-cross-origin');
    expect(headers.get('strict-transport-security')).toContain('max-age=31536000');
    expect(headers.get('x-powered-by')).toBeNull();
  }
});

test('a wrong link, a foreign next and a path out of the folder lead nowhere', async () => {
  const link = await ask(`/o/${own.orderId}?key=${'A'.repeat(27)}`, 'visitor');
  expect([link.status, link.headers.get('location'), link.headers.get('set-cookie')]).toEqual([
    303,
    `${base()}/my?link=broken`,
    null,
  ]);
  for (const path of [
    '/api/pictures/..%2f..%2fcombwood.db',
    '/api/pictures/pic_..',
    '/api/pictures/pic_none',
  ])
    expect([path, [400, 404].includes((await ask(path, 'organiser')).status)]).toEqual([path, true]);
  const forged = `combwood_orders=${own.orderId}.${'A'.repeat(27)}`;
  const order = await fetch(`${base()}/api/my/orders/${own.orderId}/tickets`, {
    headers: { cookie: forged },
  });
  expect(order.status).toBe(404);
});

test('a camp page and a player’s pages carry no address and no health detail that they do not show', async () => {
  const page = await (await ask('/camps/kettle-lake-harp-week', 'visitor')).text();
  for (const secret of ['usr_', 'org_', '@players.example', 'tomasz@'])
    expect([secret, page.includes(secret)]).toEqual([secret, false]);
  const person = await (
    await ask(`/api/organise/camps/${OWN}/people/${own.registrationId}`, 'organiser')
  ).text();
  for (const field of ['diet', 'access', 'emergency', 'guardian'])
    expect([field, person.includes(`"${field}`)]).toEqual([field, false]);
});
