import { z } from 'zod';
import { isCampCurrency } from '@/lib/domain/camp/camp-currency';
import { CAMP_LIMITS } from '@/lib/domain/camp/camp-limits';
import { dayOffset } from '@/lib/domain/camp/day-offset';
import { readTimeZone } from '@/lib/domain/camp/time-zones';
import { clockText, dayText, isDayText } from './day-and-clock';
import { lineText, optionalLine, proseText } from './line-text';
import { rowId } from './row-id';
import { wholeNumber } from './whole-number';

const timeZone = z
  .string({ error: 'Time zone is empty. Choose the one of the venue.' })
  .transform((text, context) => {
    const zone = readTimeZone(text);
    if (zone) return zone;
    context.addIssue({
      code: 'custom',
      message: `Time zone: “${text.trim().slice(0, 40)}” is not one we know. Choose a name like Europe/Berlin.`,
      input: text,
    });
    return z.NEVER;
  });

const currency = z
  .string({ error: 'Currency is empty. Choose the one that players pay in.' })
  .trim()
  .toUpperCase()
  .refine(isCampCurrency, {
    error: ({ input }) =>
      `Currency: “${String(input).slice(0, 10)}” is not one to sell in. Choose a code like EUR.`,
  });

const slug = z
  .string({ error: 'Web name is empty. Give a short one, like kettle-lake.' })
  .trim()
  .toLowerCase()
  .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, {
    error: ({ input }) =>
      `Web name: “${String(input).slice(0, 60)}” will not do. Use letters a to z, digits and single hyphens, like kettle-lake.`,
  })
  .min(3, 'Web name is too short. Use 3 characters or more.')
  .max(60, 'Web name is too long. Keep it to 60 characters.');

const name = lineText('Name', 100, 'Give the name that players know.');
const dates = { startsOn: dayText('First day'), endsOn: dayText('Last day') };
type Dates = { startsOn: string; endsOn: string };

const bothDays = (value: unknown): value is Dates => {
  const given = value as Partial<Dates> | null;
  return isDayText(String(given?.startsOn)) && isDayText(String(given?.endsOn));
};

/** Two rules about both dates; they speak even while other fields are wrong, so that one look mends all. */
const withDates = <Schema extends z.ZodType<Dates>>(schema: Schema): Schema =>
  schema
    .refine(({ startsOn, endsOn }) => endsOn >= startsOn, {
      path: ['endsOn'],
      error: 'Last day is before the first day. Give the same day or a later one.',
      when: ({ value }) => bothDays(value),
    })
    .refine(({ startsOn, endsOn }) => dayOffset(startsOn, endsOn) < CAMP_LIMITS.days, {
      path: ['endsOn'],
      error: `The camp would last more than ${CAMP_LIMITS.days} days. Check the year of both dates.`,
      when: ({ value }) => bothDays(value),
    });

/** A name, dates, a zone and a currency are enough to begin. */
export const createCampSchema = withDates(
  z.object({ organisationId: rowId('org'), name, ...dates, timeZone, currency }),
);
export type CreateCampInput = z.output<typeof createCampSchema>;

/** The camp's own row. `version` is what the form was opened with. */
export const editCampSchema = withDates(
  z.object({
    campId: rowId('cmp'),
    version: wholeNumber('Version', 1, 999_999_999),
    name,
    slug,
    ...dates,
    /** Meetings go along by as many days as the first day moves. */
    moveMeetings: z.boolean().default(false),
    timeZone,
    /** Said once more where meetings are placed: they keep their clock times. */
    zoneConfirmed: z.boolean().default(false),
    currency,
    venueName: optionalLine('Venue', 120),
    venueAddress: optionalLine('Address', 200),
    capacity: wholeNumber('Places in all', 0, CAMP_LIMITS.places),
    /** As typed; read by the camp's currency. */
    price: optionalLine('Price', 20),
    refundTerms: proseText('Refund terms', 4000),
    arrivalFrom: clockText('Arrival from'),
    summary: optionalLine('Summary', 200),
    description: proseText('Description', 10_000),
  }),
);
export type EditCampInput = z.output<typeof editCampSchema>;

/** Publish, close, reopen. */
export const campStateSchema = z.object({ campId: rowId('cmp') });

export const copyCampSchema = z.object({
  campId: rowId('cmp'),
  name,
  startsOn: dayText('First day'),
  withPictures: z.boolean().default(false),
});
export type CopyCampInput = z.output<typeof copyCampSchema>;
