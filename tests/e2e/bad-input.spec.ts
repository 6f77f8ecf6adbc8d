import { expect, test } from '@playwright/test';
import { type RawForm, readForm, sendForm } from './raw-form';
import { makeCookies, openRows, type Sender } from './role-cookies';
import { errorsOf, openPage } from './sign-in';

const SHOP = '/camps/kettle-lake-harp-week';
const CAMP = '/organise/camps/cmp_second';
const ORGANISATION = '/organise/organisations/org_second';
const MARKUP = `"><img src=x onerror="document.title='ran'"><b>`;
const REFUSED = 'This did not go through';

let cookies: Record<Sender, string>;
test.beforeAll(() => {
  cookies = makeCookies();
});

// Every form that a person types into: where it is, the words of its button, who may open it.
const FORMS: readonly (readonly [string, string, Sender])[] = [
  ['/sign-in', 'Sign in', 'visitor'],
  ['/sign-up', 'Open the account', 'visitor'],
  ['/reset', 'Send the link', 'visitor'],
  ['/my', 'Mail me the link', 'visitor'],
  [`${SHOP}/register/who`, 'Continue', 'visitor'],
  ['/account', 'Save the name', 'second'],
  ['/account', 'Change the password', 'second'],
  ['/account', 'Move to this address', 'second'],
  ['/organise/new', 'Start', 'second'],
  [`${ORGANISATION}/details`, 'Save', 'second'],
  [`${ORGANISATION}/staff`, 'Send the invitation', 'second'],
  [`${ORGANISATION}/camps/new`, 'Make the draft', 'second'],
  [`${CAMP}/details`, 'Save', 'second'],
  [`${CAMP}/tracks/new`, 'Add the track', 'second'],
  [`${CAMP}/rooms/new`, 'Add the room', 'second'],
  [`${CAMP}/instructors/new`, 'Add the instructor', 'second'],
  [`${CAMP}/workshops/new`, 'Add the workshop', 'second'],
  [`${CAMP}/times`, 'Add this time', 'second'],
  [`${CAMP}/copy`, 'Make the copy', 'second'],
];

const typing = (form: RawForm, value: string) => [
  ...form.typed.map((name) => [name, value] as const),
  ...form.chosen,
];

for (const [path, button, as] of FORMS)
  test(`the form at ${path} with “${button}” refuses what is empty, over-long or of the wrong kind, and runs no markup`, async () => {
    const cookie = cookies[as];
    const form = await readForm(path, button, cookie);
    expect(form.typed.length).toBeGreaterThan(0);
    const empty = await sendForm(form, [], { cookie });
    expect([empty.status, empty.text.includes(REFUSED)]).toEqual([200, true]);
    const long = await sendForm(form, typing(form, 'x'.repeat(30_000)), { cookie });
    expect([long.status, long.text.includes(REFUSED)]).toEqual([200, true]);
    const odd = await sendForm(form, [...typing(form, 'x'), ['name[100000000]', 'x']], { cookie });
    expect([odd.status, odd.text.includes('no page of ours sends')]).toEqual([200, true]);
    // Taken or refused: nothing that comes back holds the markup as markup.
    const markup = await sendForm(form, typing(form, MARKUP), { cookie });
    expect([200, 303]).toContain(markup.status);
    expect(markup.text).not.toMatch(/<img src=x/);
    for (const told of [empty, long, odd, markup]) expect(told.text).not.toContain('went wrong on our side');
  });

test('an organiser who names everything in markup reads it as text, on each page', async ({
  browser,
  baseURL,
}) => {
  const cookie = cookies.second;
  const add = async (path: string, button: string, values: [string, string][]) => {
    const told = await sendForm(await readForm(`${CAMP}${path}`, button, cookie), values, { cookie });
    expect([path, told.status]).toEqual([path, 303]);
  };
  const track: [string, string][] = [
    ['name', MARKUP],
    ['gate', MARKUP],
    ['capacity', '12'],
  ];
  const { chosen } = await readForm(`${CAMP}/tracks/new`, 'Add the track', cookie);
  await add('/tracks/new', 'Add the track', [...track, ...chosen]);
  const room = await readForm(`${CAMP}/rooms/new`, 'Add the room', cookie);
  await add('/rooms/new', 'Add the room', [['name', MARKUP], ['seats', '12'], ...room.chosen]);
  const page = await openPage(browser);
  const [name = '', value = ''] = cookie.split('=');
  await page.context().addCookies([{ name, value, url: baseURL ?? '' }]);
  for (const path of ['/tracks', '/rooms', '/preview', '/timetable', '']) {
    await page.goto(`${CAMP}${path}`);
    if (path === '/tracks' || path === '/rooms' || path === '/preview')
      await expect(page.getByText(MARKUP).first()).toBeVisible();
    await expect(page).not.toHaveTitle('ran');
    expect(await page.locator('img[src="x"]').count()).toBe(0);
  }
  expect(errorsOf(page)).toEqual([]);
  await page.context().close();
});

test('dates that cannot be are refused by field: a camp that ends before it starts, no such day, a year of days', async () => {
  const cookie = cookies.second;
  const form = await readForm(`${ORGANISATION}/camps/new`, 'Make the draft', cookie);
  const count = () => {
    const db = openRows();
    const { n } = db.prepare("select count(*) as n from camp where organisation_id = 'org_second'").get() as {
      n: number;
    };
    db.close();
    return n;
  };
  const before = count();
  for (const [startsOn, endsOn, says] of [
    ['2031-05-04', '2031-05-02', 'Last day is before the first day'],
    ['2031-02-30', '2031-03-02', 'First day'],
    ['2031-05-04', '2032-05-04', 'more than 31 days'],
    ['4 May', '2031-05-04', 'First day'],
  ] as const) {
    const told = await sendForm(
      form,
      [
        ['name', 'Fjord Harp Days'],
        ['startsOn', startsOn],
        ['endsOn', endsOn],
        ['timeZone', 'Europe/Oslo'],
        ['currency', 'NOK'],
      ],
      { cookie },
    );
    expect(told.status).toBe(200);
    expect(told.text).toContain(REFUSED);
    expect(told.text).toContain(says);
    expect(told.text).toContain('value="Fjord Harp Days"');
  }
  expect(count()).toBe(before);
});

test('the steps of registering refuse what is empty, of another camp or garbage, and show a name of markup as text', async () => {
  const who = await sendForm(await readForm(`${SHOP}/register/who`, 'Continue'), [
    ['attendeeName', MARKUP],
    ['attendeeEmail', 'zoe@players.example'],
    ['payer', 'attendee'],
    ['minor', 'no'],
    // No form has these.
    ['price', '1'],
    ['state', 'confirmed'],
  ]);
  expect([who.status, who.to.endsWith('/register/track')]).toEqual([303, true]);
  const { cookie } = who;
  const step = async (name: string, values: [string, string][]) =>
    sendForm(await readForm(`${SHOP}/register/${name}`, 'Continue', cookie), values, { cookie });
  const refused = async (name: string, values: [string, string][], says: string) => {
    const told = await step(name, values);
    expect([name, values, told.status, told.text.includes(says)]).toEqual([name, values, 200, true]);
  };
  const early = await fetch(`${process.env.E2E_APP_URL}${SHOP}/register/check`, {
    redirect: 'manual',
    headers: { cookie },
  });
  expect([early.status, early.headers.get('location')]).toEqual([307, `${SHOP}/register/track`]);

  await refused('track', [], 'Choose a track');
  await refused('track', [['trackId', 'trk_seconda']], 'does not have that track');
  await refused('track', [['trackId', '1 or 1=1']], 'Choose a track from the list');
  const { chosen } = await readForm(`${SHOP}/register/track`, 'Continue', cookie);
  const open = chosen.filter(([name]) => name === 'trackId');
  await refused('track', [...open, ['electives', 'wsh_none']], 'not an elective of this camp');
  expect((await step('track', open)).status).toBe(303);
  await refused('harps', [['harpIds', 'Q-richter-low']], REFUSED);
  await refused('harps', [['harpIds', MARKUP]], REFUSED);
  expect((await step('harps', [['harpIds', 'A-richter-standard']])).status).toBe(303);
  await refused('needs', [], 'Give their phone number');
  const called: [string, string] = ['emergencyName', MARKUP];
  await refused('needs', [called, ['emergencyPhone', 'by pigeon']], 'is not a phone number');
  await refused(
    'needs',
    [called, ['emergencyPhone', '+49305550100'], ['diet', 'x'.repeat(1001)]],
    'longer than 1,000',
  );
  expect((await step('needs', [called, ['emergencyPhone', '+49 30 5550100'], ['diet', MARKUP]])).status).toBe(
    303,
  );
  const check = await fetch(`${process.env.E2E_APP_URL}${SHOP}/register/check`, { headers: { cookie } });
  const text = await check.text();
  expect(check.headers.get('cache-control')).toContain('no-store');
  expect(text).toContain('&lt;img src=x');
  expect(text).not.toContain('<img src=x');
});
