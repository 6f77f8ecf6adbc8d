import { expect, test } from 'vitest';
import { deviceLabel } from '@/lib/domain/account/device-label';
import { homeFor } from '@/lib/domain/account/home-for';
import { suggestEmail } from '@/lib/domain/account/suggest-email';
import { emailSchema, nameSchema, signUpSchema } from '@/lib/schemas/account';

// Forms of User-Agent as browsers send them, from memory.
test.each([
  ['Mozilla/5.0 (Windows NT 10.0; Win64; x64; rv:140.0) Gecko/20100101 Firefox/140.0', 'Firefox on Windows'],
  [
    'Mozilla/5.0 (iPhone; CPU iPhone OS 18_5 like Mac OS X) Version/18.5 Mobile/15E148 Safari/604.1',
    'Safari on iPhone',
  ],
  [
    'Mozilla/5.0 (Linux; Android 15) AppleWebKit/537.36 Chrome/139.0 Mobile Safari/537.36',
    'Chrome on Android',
  ],
  [
    'Mozilla/5.0 (Windows NT 10.0) AppleWebKit/537.36 Chrome/139.0 Safari/537.36 Edg/139.0',
    'Edge on Windows',
  ],
  ['curl/8', 'A browser'],
  ['<script>alert(1)</script>', 'A browser'],
  [null, 'A browser'],
])('%j is %j', (agent, label) => expect(deviceLabel(agent)).toBe(label));

test.each([
  ['sam@lakemail.con', 'sam@lakemail.com'],
  ['sam@lakemail.ogr', 'sam@lakemail.org'],
  ['sam@lakemial.example', 'sam@lakemail.example'],
  ['sam@lakmail.example', 'sam@lakemail.example'],
  ['sam@lakeemail.example', 'sam@lakemail.example'],
  ['sam@lakemail.example', null],
  ['sam@pond.example', null],
])('%s may mean %s', (typed, meant) => expect(suggestEmail(typed, ['lakemail.example'])).toBe(meant));

test('people land where they work', () => {
  expect(homeFor([])).toBe('/my');
  expect(homeFor([{ role: 'door' }])).toBe('/door');
  expect(homeFor([{ role: 'door' }, { role: 'treasurer' }])).toBe('/organise');
});

// ASVS 5.0, 1.3.11: no line break gets into a header.
test.each([
  'sam@example.test\r\nBcc: all@example.test',
  'sam@exam\nple.test',
  'sam\u0000@example.test',
  'sam@@x',
  '@x.test',
  'sam',
])('refuses the address %j', (given) => expect(emailSchema.safeParse(given).success).toBe(false));

test('an address is trimmed and lower-cased', () => {
  expect(emailSchema.parse('  Sam.O@Example.TEST ')).toBe('sam.o@example.test');
});

test.each(['', '   ', 'Sam\r\nSubject: x', 'x'.repeat(121)])('refuses the name %j', (given) =>
  expect(nameSchema.safeParse(given).success).toBe(false),
);

test('a new name carries no advertisement into a stranger’s letter', () => {
  const base = { email: 'a@example.test', password: 'boat reed walnut' };
  for (const name of ['Win at http://evil.example', 'see www.evil.example', 'a@evil.example'])
    expect(signUpSchema.safeParse({ ...base, name }).success).toBe(false);
  for (const name of ['Łucja Øverland', '王小明', "O'Neill-D’Arcy Jr.", '<b>Bo</b>'])
    expect(signUpSchema.safeParse({ ...base, name }).success).toBe(true);
});
