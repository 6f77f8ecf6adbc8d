import { Temporal } from 'temporal-polyfill';

const LOCALE = 'en-GB';

// Made once: a formatter costs a hundred times what it formats, and lists say many days.
const LONG_DAY = new Intl.DateTimeFormat(LOCALE, {
  weekday: 'long',
  day: 'numeric',
  month: 'long',
  year: 'numeric',
  timeZone: 'UTC',
});
const SHORT_DAY = new Intl.DateTimeFormat(LOCALE, {
  weekday: 'short',
  day: 'numeric',
  month: 'long',
  timeZone: 'UTC',
});

/** A calendar day has no zone: read and said in UTC it stays the same day everywhere. Throws when it is no day. */
const say = (format: Intl.DateTimeFormat, day: string): string =>
  format.format(new Date(`${day}T00:00:00Z`)).replace(',', '');

/** "Friday 5 June 2026". */
export const sayDay = (day: string): string => say(LONG_DAY, day);

/** "Fri 5 June". */
export const sayShortDay = (day: string): string => say(SHORT_DAY, day);

/** "5–9 June 2026", "30 May – 3 June 2026". */
export function sayDays(first: string, last: string): string {
  const from = Temporal.PlainDate.from(first);
  const to = Temporal.PlainDate.from(last);
  const full = { day: 'numeric', month: 'long', year: 'numeric' } as const;
  if (from.equals(to)) return from.toLocaleString(LOCALE, full);
  if (from.year === to.year && from.month === to.month)
    return `${from.day}–${to.toLocaleString(LOCALE, full)}`;
  const start = from.year === to.year ? ({ day: 'numeric', month: 'long' } as const) : full;
  return `${from.toLocaleString(LOCALE, start)} – ${to.toLocaleString(LOCALE, full)}`;
}

/** "Fri 5 June 2026, 14:05 (Europe/Berlin)": an instant is never shown without its zone. */
export function sayInstant(at: number, timeZone: string): string {
  const zoned = Temporal.Instant.fromEpochMilliseconds(at).toZonedDateTimeISO(timeZone);
  const day = zoned.toLocaleString(LOCALE, {
    weekday: 'short',
    day: 'numeric',
    month: 'short',
    year: 'numeric',
  });
  return `${day.replace(',', '')}, ${zoned.toPlainTime().toString({ smallestUnit: 'minute' })} (${timeZone})`;
}
