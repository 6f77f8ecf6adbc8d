import { Temporal } from 'temporal-polyfill';

const LOCALE = 'en-GB';

/** "Friday 5 June 2026". */
export const sayDay = (day: string): string =>
  Temporal.PlainDate.from(day)
    .toLocaleString(LOCALE, { weekday: 'long', day: 'numeric', month: 'long', year: 'numeric' })
    .replace(',', '');

/** "Fri 5 June". */
export const sayShortDay = (day: string): string =>
  Temporal.PlainDate.from(day)
    .toLocaleString(LOCALE, { weekday: 'short', day: 'numeric', month: 'long' })
    .replace(',', '');

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
