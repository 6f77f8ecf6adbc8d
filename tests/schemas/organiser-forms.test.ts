import { parseWithZod } from '@conform-to/zod/v4';
import { describe, expect, test } from 'vitest';
import type { z } from 'zod';
import { blockSchema } from '@/lib/schemas/block';
import { copyCampSchema, createCampSchema, editCampSchema } from '@/lib/schemas/camp';
import { instructorSchema } from '@/lib/schemas/instructor';
import { moveRowSchema } from '@/lib/schemas/move';
import { createOrganisationSchema } from '@/lib/schemas/organisation';
import { addPictureSchema } from '@/lib/schemas/picture';
import { roomSchema } from '@/lib/schemas/room';
import { trackSchema } from '@/lib/schemas/track';
import { workshopSchema } from '@/lib/schemas/workshop';

/** What a browser, or somebody without one, posts. */
function post(schema: z.ZodType, fields: Record<string, string | File | string[]>) {
  const form = new FormData();
  for (const [name, value] of Object.entries(fields))
    for (const part of [value].flat()) form.append(name, part as string);
  const submission = parseWithZod(form, { schema });
  return {
    value: submission.status === 'success' ? (submission.value as Record<string, unknown>) : null,
    errors: (submission.status === 'success' ? {} : (submission.reply().error ?? {})) as Record<
      string,
      string[]
    >,
  };
}

const CAMP = {
  organisationId: 'org_1',
  name: 'Porch Days',
  startsOn: '2027-06-04',
  endsOn: '2027-06-06',
  timeZone: 'Europe/Berlin',
  currency: 'EUR',
};
const DETAILS = {
  ...CAMP,
  campId: 'cmp_1',
  version: '3',
  slug: 'porch-days',
  capacity: '40',
  arrivalFrom: '14:00',
  price: '460.00',
};
const TRACK = { campId: 'cmp_1', name: 'Bending', level: 'bending', capacity: '12' };
const ROOM = { campId: 'cmp_1', name: 'Barn', seats: '20', loudness: 'quiet' };
const WORKSHOP = {
  campId: 'cmp_1',
  title: 'Train songs',
  kind: 'technique',
  audience: 'elective',
  lengthMinutes: '75',
};

describe('each form sent empty names every field that must be there, with a remedy', () => {
  const cases: [string, z.ZodType, Record<string, string>, string[]][] = [
    ['organisation', createOrganisationSchema, {}, ['name', 'email']],
    [
      'camp',
      createCampSchema,
      { organisationId: 'org_1' },
      ['name', 'startsOn', 'endsOn', 'timeZone', 'currency'],
    ],
    [
      'details',
      editCampSchema,
      { campId: 'cmp_1', version: '1' },
      ['name', 'slug', 'startsOn', 'endsOn', 'timeZone', 'currency', 'capacity', 'arrivalFrom'],
    ],
    ['copy', copyCampSchema, { campId: 'cmp_1' }, ['name', 'startsOn']],
    ['track', trackSchema, { campId: 'cmp_1' }, ['name', 'level', 'capacity']],
    ['room', roomSchema, { campId: 'cmp_1' }, ['name', 'seats', 'loudness']],
    ['instructor', instructorSchema, { campId: 'cmp_1' }, ['name']],
    ['time of day', blockSchema, { campId: 'cmp_1' }, ['starts', 'ends']],
    ['workshop', workshopSchema, { campId: 'cmp_1' }, ['title', 'kind', 'audience', 'lengthMinutes']],
    ['picture', addPictureSchema, { campId: 'cmp_1' }, ['alt', 'file']],
  ];
  test.each(cases)('%s', (_, schema, fields, named) => {
    const { errors } = post(schema, fields);
    expect(Object.keys(errors).sort()).toEqual([...named].sort());
    for (const said of Object.values(errors).flat()) {
      expect(said).toMatch(/ .*\./);
      expect(said).not.toMatch(/invalid|undefined|NaN|expected/i);
    }
  });
});

describe('wrong values are told back with the remedy', () => {
  const cases: [string, z.ZodType, Record<string, string>, string, RegExp][] = [
    [
      'a camp that ends before it starts',
      createCampSchema,
      { ...CAMP, endsOn: '2027-06-01' },
      'endsOn',
      /before the first day/,
    ],
    [
      'dates in order are judged while the name is missing',
      createCampSchema,
      { ...CAMP, name: '', endsOn: '2027-06-01' },
      'endsOn',
      /before the first day/,
    ],
    [
      'a day that is not in the calendar',
      createCampSchema,
      { ...CAMP, startsOn: '2027-02-30' },
      'startsOn',
      /“2027-02-30”/,
    ],
    ['a year far off', createCampSchema, { ...CAMP, endsOn: '9999-12-31' }, 'endsOn', /“9999-12-31”/],
    ['a wrong year', createCampSchema, { ...CAMP, endsOn: '2028-06-06' }, 'endsOn', /more than 31 days/],
    ['a zone by offset', createCampSchema, { ...CAMP, timeZone: '+01:00' }, 'timeZone', /“\+01:00”/],
    [
      'a zone that is none',
      createCampSchema,
      { ...CAMP, timeZone: 'Mars/Base' },
      'timeZone',
      /Europe\/Berlin/,
    ],
    ['gold for money', createCampSchema, { ...CAMP, currency: 'XAU' }, 'currency', /“XAU”/],
    ['a web name with markup', editCampSchema, { ...DETAILS, slug: '<b>x</b>' }, 'slug', /letters a to z/],
    ['a path for a web name', editCampSchema, { ...DETAILS, slug: '../etc' }, 'slug', /letters a to z/],
    ['places in words', editCampSchema, { ...DETAILS, capacity: 'many' }, 'capacity', /“many”.*0 to 5000/],
    ['places below nothing', trackSchema, { ...TRACK, capacity: '-3' }, 'capacity', /“-3”/],
    ['half a seat', roomSchema, { ...ROOM, seats: '1.5' }, 'seats', /whole number/],
    ['a number past all bounds', roomSchema, { ...ROOM, seats: '1e99' }, 'seats', /“1e99”/],
    ['a level posted past the list', trackSchema, { ...TRACK, level: 'wizard' }, 'level', /not chosen/],
    [
      'a time past midnight written wrong',
      blockSchema,
      { campId: 'cmp_1', starts: '24:30', ends: '25:00' },
      'starts',
      /“24:30”/,
    ],
    [
      'a time that lasts nothing',
      blockSchema,
      { campId: 'cmp_1', starts: '10:00', ends: '10:00' },
      'ends',
      /same as from/,
    ],
    [
      'a core workshop without a track',
      workshopSchema,
      { ...WORKSHOP, audience: 'core' },
      'trackIds',
      /none is ticked/,
    ],
    ['a foreign kind of id', trackSchema, { ...TRACK, campId: 'ord_1' }, 'campId', /Choose/],
    ['an id with SQL in it', trackSchema, { ...TRACK, trackId: "trk_1' or 1=1" }, 'trackId', /Choose/],
    [
      'a list that is not one',
      moveRowSchema,
      { list: 'users', campId: 'cmp_1', id: 'usr_1', towards: 'up' },
      'list',
      /Say which list/,
    ],
    [
      'a harp without its key',
      workshopSchema,
      { ...WORKSHOP, 'needs[0].level': 'required', 'needs[0].anyOf[0].by': 'harp' },
      'needs[0].anyOf[0].labelKey',
      /Choose a key/,
    ],
    [
      'a position that is none',
      workshopSchema,
      {
        ...WORKSHOP,
        'needs[0].level': 'required',
        'needs[0].anyOf[0].by': 'song',
        'needs[0].anyOf[0].songKey': 'E',
        'needs[0].anyOf[0].position': '13',
      },
      'needs[0].anyOf[0].position',
      /1 to 12/,
    ],
  ];
  test.each(cases)('%s', (_, schema, fields, field, said) => {
    expect(post(schema, fields).errors[field]?.join(' ')).toMatch(said);
  });
});

describe('over-long and odd text', () => {
  test.each([
    [createOrganisationSchema, { email: 'a@example.org' }, 'name', 100],
    [createCampSchema, CAMP, 'name', 100],
    [editCampSchema, DETAILS, 'description', 10_000],
    [editCampSchema, DETAILS, 'refundTerms', 4000],
    [trackSchema, TRACK, 'gate', 500],
    [roomSchema, ROOM, 'kit', 300],
    [instructorSchema, { campId: 'cmp_1', name: 'Ana' }, 'bio', 1500],
    [workshopSchema, WORKSHOP, 'title', 100],
  ] as [z.ZodType, Record<string, string>, string, number][])(
    '%#: one character too many is counted back',
    (schema, rest, field, most) => {
      expect(post(schema, { ...rest, [field]: 'x'.repeat(most) }).errors).toEqual({});
      expect(post(schema, { ...rest, [field]: 'x'.repeat(most + 1) }).errors[field]?.[0]).toContain(
        `has ${most + 1} characters; keep it to ${most}`,
      );
    },
  );

  test('markup is text like any other and comes back as typed', () => {
    const name = '<img src=x onerror=alert(1)> & "Söhne"';
    expect(post(createCampSchema, { ...CAMP, name }).value?.name).toBe(name);
  });

  // ASVS 1.3.11: a line break in a name could start a new header in a mail.
  test('a line break in a name is refused', () => {
    expect(post(createCampSchema, { ...CAMP, name: 'A\r\nBcc: b@example.org' }).errors.name?.[0]).toMatch(
      /line break/,
    );
  });

  test('line breaks of all kinds in long text become one kind', () => {
    expect(post(editCampSchema, { ...DETAILS, description: 'a\r\nb\rc\n' }).value?.description).toBe(
      'a\nb\nc',
    );
  });
});

// ASVS 15.3.3: fields that a form does not have are left out, whoever sends them.
test('state, organisation and owner cannot be sent along', () => {
  const { value } = post(editCampSchema, {
    ...DETAILS,
    state: 'published',
    organisationId: 'org_2',
    publishedAt: '1',
  });
  expect(value).not.toBeNull();
  for (const name of ['state', 'organisationId', 'publishedAt']) expect(value).not.toHaveProperty(name);
});

test('a harp need by song, with an alternative by key, reads into asks', () => {
  const { value, errors } = post(workshopSchema, {
    ...WORKSHOP,
    capacity: '',
    'needs[0].level': 'helpful',
    'needs[0].note': 'for the slow one',
    'needs[0].anyOf[0].by': 'song',
    'needs[0].anyOf[0].songKey': 'Gm',
    'needs[0].anyOf[0].position': '3',
    'needs[0].anyOf[0].labelKey': '',
    'needs[0].anyOf[0].tuning': 'richter',
    'needs[0].anyOf[0].register': 'standard',
    'needs[0].anyOf[1].by': 'harp',
    'needs[0].anyOf[1].labelKey': 'Gb',
    'needs[0].anyOf[1].tuning': 'richter',
    'needs[0].anyOf[1].register': 'low',
  });
  expect(errors).toEqual({});
  expect(value?.capacity).toBeNull();
  expect(value?.needs).toEqual([
    {
      level: 'helpful',
      note: 'for the slow one',
      anyOf: [
        {
          by: 'song',
          songKey: { tonic: 'G', minor: true },
          position: 3,
          tuning: 'richter',
          register: 'standard',
        },
        { by: 'harp', labelKey: 'F#', tuning: 'richter', register: 'low' },
      ],
    },
  ]);
});

test('an upload over 10 MB says its size, an empty one that it is empty', () => {
  const at = (bytes: number) =>
    post(addPictureSchema, {
      campId: 'cmp_1',
      alt: 'The hall',
      file: new File([new Uint8Array(bytes)], 'x.jpg'),
    }).errors.file?.[0];
  expect(at(10 * 1024 * 1024 + 1)).toMatch(/10\.0 MB; the limit is 10 MB/);
  expect(at(0)).toMatch(/not chosen|empty/);
  expect(at(5)).toBeUndefined();
});
