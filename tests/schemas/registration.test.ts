import { parseWithZod } from '@conform-to/zod/v4';
import { describe, expect, test } from 'vitest';
import type { z } from 'zod';
import { readAnswers } from '@/lib/schemas/answers';
import {
  harpsFormSchema,
  needsFormSchema,
  orderFormSchema,
  submitFormSchema,
  trackFormSchema,
  whoFormSchema,
} from '@/lib/schemas/registration';
import { checkNeeds } from '@/lib/server/registration/answer-needs';

type Fields = Record<string, string | string[]>;

/** As a browser, or somebody without one, posts it. */
function post<Schema extends z.ZodType>(schema: Schema, fields: Fields) {
  const form = new FormData();
  for (const [name, value] of Object.entries(fields))
    for (const one of [value].flat()) form.append(name, one);
  const submission = parseWithZod(form, { schema });
  return submission.status === 'success'
    ? { value: submission.value as z.output<Schema>, errors: {} as Record<string, string[]> }
    : { value: null, errors: (submission.reply().error ?? {}) as Record<string, string[]> };
}

const who = {
  slug: 'kettle-lake',
  attendeeName: 'Noor Haddad',
  attendeeEmail: 'noor@example.test',
  payer: 'attendee',
  minor: 'no',
};
const needs = { slug: 'kettle-lake', emergencyName: 'Sami', emergencyPhone: '+44 20 7946 0018' };
const long = (length: number) => 'x'.repeat(length);

describe('who', () => {
  test('is taken with spaces trimmed and the address in lower case', () => {
    expect(
      post(whoFormSchema, { ...who, attendeeName: '  Łucja  ', attendeeEmail: ' Noor@Example.TEST ' }).value,
    ).toEqual({
      slug: 'kettle-lake',
      attendeeName: 'Łucja',
      attendeeEmail: 'noor@example.test',
      payer: 'attendee',
      payerName: '',
      payerEmail: '',
      minor: false,
    });
  });
  test('empty but for another payer: the payer is asked for in the same answer', () => {
    const { errors } = post(whoFormSchema, { slug: 'kettle-lake', payer: 'other' });
    expect(Object.keys(errors).sort()).toEqual([
      'attendeeEmail',
      'attendeeName',
      'minor',
      'payerEmail',
      'payerName',
    ]);
  });
  test('empty: every question names its remedy, and none a zod message', () => {
    const { errors } = post(whoFormSchema, { slug: 'kettle-lake' });
    expect(errors).toEqual({
      attendeeName: ['Give the full name of the person who comes.'],
      attendeeEmail: ['Give an e-mail address: the ticket goes there.'],
      payer: ['Say who pays.'],
      minor: ['Say whether they will be under 18.'],
    });
  });
  test.each<[string, Fields, string, RegExp]>([
    ['a name of 121 characters', { attendeeName: long(121) }, 'attendeeName', /longer than 120/],
    ['a name of spaces', { attendeeName: '   ' }, 'attendeeName', /Give the full name/],
    [
      'a line break in a name (ASVS 1.3.11)',
      { attendeeName: 'Noor\r\nBcc: all@example.test' },
      'attendeeName',
      /cannot be shown/,
    ],
    ['a zero byte', { attendeeName: 'No\u0000or' }, 'attendeeName', /cannot be shown/],
    ['text that runs backwards', { attendeeName: 'Noor\u202etxt' }, 'attendeeName', /cannot be shown/],
    ['no address', { attendeeEmail: 'noor' }, 'attendeeEmail', /not an e-mail address/],
    [
      'two addresses',
      { attendeeEmail: 'a@example.test, b@example.test' },
      'attendeeEmail',
      /not an e-mail address/,
    ],
    [
      'a line break in an address',
      { attendeeEmail: 'a@example.test\nBcc: b@example.test' },
      'attendeeEmail',
      /not an e-mail address/,
    ],
    ['an address of 255 characters', { attendeeEmail: `${long(243)}@example.org` }, 'attendeeEmail', /254/],
    [
      'another payer without a name',
      { payer: 'other', payerEmail: 'p@example.test' },
      'payerName',
      /who pays/,
    ],
    [
      'another payer without an address',
      { payer: 'other', payerName: 'P' },
      'payerEmail',
      /receipt goes there/,
    ],
    ['a payer that is no choice', { payer: 'nobody' }, 'payer', /Say who pays/],
    ['an age that is no choice', { minor: 'maybe' }, 'minor', /under 18/],
    ['an address twice', { attendeeEmail: ['a@example.test', 'b@example.test'] }, 'attendeeEmail', /./],
  ])('%s', (_what, slip, field, message) => {
    const { errors } = post(whoFormSchema, { ...who, ...slip });
    expect(errors[field]?.join(' ')).toMatch(message);
  });
  test('markup is text: kept as typed, for the page to escape (ASVS 1.2.1)', () => {
    expect(post(whoFormSchema, { ...who, attendeeName: '<b>Noor</b> & "co"' }).value).toMatchObject({
      attendeeName: '<b>Noor</b> & "co"',
    });
  });
  test('fields that no form has are dropped (ASVS 15.3.3)', () => {
    const more = {
      price: '1',
      paid: 'true',
      role: 'organiser',
      state: 'confirmed',
      total: '0',
      heldUntil: '9e15',
      id: 'reg_x',
    };
    expect(Object.keys(post(whoFormSchema, { ...who, ...more }).value ?? {}).sort()).toEqual(
      ['attendeeEmail', 'attendeeName', 'minor', 'payer', 'payerEmail', 'payerName', 'slug'].sort(),
    );
    expect(post(submitFormSchema, { slug: 'kettle-lake', ...more }).value).toEqual({ slug: 'kettle-lake' });
    expect(post(orderFormSchema, { orderId: 'ord_1', amount: '1', ...more }).value).toEqual({
      orderId: 'ord_1',
    });
    expect(post(trackFormSchema, { slug: 's', trackId: 'trk_1', ...more }).value).toEqual({
      slug: 's',
      trackId: 'trk_1',
      electives: [],
    });
  });
  test('a payer’s leftovers are not kept when the attendee pays after all', () => {
    expect(
      post(whoFormSchema, { ...who, payerName: 'Old', payerEmail: 'not even an address' }).value,
    ).toMatchObject({
      payerName: '',
      payerEmail: '',
    });
  });
});

describe('track and harps', () => {
  test.each<[string, Fields, string]>([
    ['nothing chosen', {}, 'trackId'],
    ['an id of another kind', { trackId: 'cmp_1' }, 'trackId'],
    ['SQL for an id (ASVS 1.2.4)', { trackId: "trk_1' or '1'='1" }, 'trackId'],
    ['an elective that is none', { trackId: 'trk_1', electives: ['trk_1'] }, 'electives[0]'],
  ])('%s', (_what, fields, field) => {
    expect(post(trackFormSchema, { slug: 's', ...fields }).errors[field]?.join(' ')).toMatch(/Choose/);
  });
  test('an elective ticked twice counts once', () => {
    expect(
      post(trackFormSchema, { slug: 's', trackId: 'trk_1', electives: ['wsh_a', 'wsh_a'] }).value?.electives,
    ).toEqual(['wsh_a']);
  });
  test('no harp is an answer; a strange one is named', () => {
    expect(post(harpsFormSchema, { slug: 's' }).value).toMatchObject({
      harpIds: [],
      intent: 'next',
    });
    expect(
      post(harpsFormSchema, { slug: 's', harpIds: ['X-richter-standard'] }).errors['harpIds[0]']?.join(' '),
    ).toMatch(/not a harp/);
    expect(post(harpsFormSchema, { slug: 's', addKey: 'H' }).errors.addKey?.join(' ')).toMatch(/H|key/);
    expect(
      post(harpsFormSchema, { slug: 's', harpIds: Array(300).fill('C-richter-standard') }).value,
    ).toBeNull();
  });
});

describe('needs', () => {
  const check = (given: Fields, minor = false) => {
    const read = post(needsFormSchema, { ...needs, ...given });
    if (!read.value) return read.errors;
    const checked = checkNeeds(read.value, { minor, timeZone: 'Europe/Berlin' });
    return checked.ok ? {} : (checked.error.fields ?? {});
  };
  test('empty for a minor: all that is missing is told at once', () => {
    expect(Object.keys(check({ emergencyName: '', emergencyPhone: '' }, true)).sort()).toEqual([
      'consent',
      'emergencyName',
      'emergencyPhone',
      'guardianEmail',
      'guardianName',
      'guardianPhone',
    ]);
  });
  test.each<[string, Fields, boolean, string, RegExp]>([
    ['nobody to call', { emergencyName: '' }, false, 'emergencyName', /somebody to call/],
    ['no phone', { emergencyPhone: '' }, false, 'emergencyPhone', /phone number/],
    [
      'a phone that is none',
      { emergencyPhone: 'ask Sami' },
      false,
      'emergencyPhone',
      /“ask Sami”.*country code/,
    ],
    ['a note of 1,001 characters', { diet: long(1001) }, false, 'diet', /1,000/],
    ['a zero byte in a note', { access: 'a\u0000b' }, false, 'access', /cannot be shown/],
    ['a minor without a guardian', {}, true, 'guardianName', /parent or guardian/],
    [
      'a minor without consent',
      { guardianName: 'S', guardianEmail: 's@example.test', guardianPhone: '030 1234567' },
      true,
      'consent',
      /must agree/,
    ],
    [
      'a guardian’s address that is none',
      { guardianName: 'S', guardianEmail: 's', guardianPhone: '030 1234567', consent: 'on' },
      true,
      'guardianEmail',
      /e-mail/,
    ],
    [
      'a guardian without a phone',
      { guardianName: 'S', guardianEmail: 's@example.test', consent: 'on' },
      true,
      'guardianPhone',
      /phone/,
    ],
  ])('%s', (_what, given, minor, field, message) => {
    expect(check(given, minor)[field]?.join(' ')).toMatch(message);
  });
  test('a note may have lines and any script; an adult’s guardian fields are dropped', () => {
    const read = post(needsFormSchema, {
      ...needs,
      diet: 'Keine Nüsse\r\n花生过敏',
      guardianName: 'X',
      consent: 'on',
    });
    expect(read.value).toMatchObject({ diet: 'Keine Nüsse\r\n花生过敏' });
    expect(read.value && checkNeeds(read.value, { minor: false, timeZone: 'Europe/Berlin' })).toMatchObject({
      value: { emergencyPhone: '+442079460018', guardianName: '', consent: false },
    });
  });
  test('a minor with all of it', () => {
    expect(
      check(
        { guardianName: 'S', guardianEmail: 's@example.test', guardianPhone: '030 1234567', consent: 'on' },
        true,
      ),
    ).toEqual({});
  });
});

test('a draft that no longer fits its schema counts as not answered', () => {
  const { slug: _slug, ...answer } = who;
  expect(
    readAnswers({ who: { ...answer, minor: false }, track: { trackId: 7 }, harps: 'none', warned: 'x' }),
  ).toEqual({
    who: { ...answer, payerName: '', payerEmail: '', minor: false },
  });
});
