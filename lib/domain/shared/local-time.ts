import { Temporal } from 'temporal-polyfill';

/** ISO dates from `first` to `last`, both included; empty when `last` is earlier. */
export function daysBetween(first: string, last: string): string[] {
  const days: string[] = [];
  for (
    let day = Temporal.PlainDate.from(first);
    Temporal.PlainDate.compare(day, last) <= 0;
    day = day.add({ days: 1 })
  )
    days.push(day.toString());
  return days;
}

/** The day before, the day and the day after: what can overlap a meeting that runs past midnight. */
export const daysAround = (day: string): string[] => {
  const at = Temporal.PlainDate.from(day);
  return [at.subtract({ days: 1 }).toString(), day, at.add({ days: 1 }).toString()];
};

/**
 * Half-open interval in epoch ms of wall time `day` + `starts` (HH:MM) in an IANA zone, `minutes` of real time long.
 * A wall time that a clock change skips moves forward, one that comes twice is its first (Temporal's "compatible").
 */
export function localInterval(
  day: string,
  starts: string,
  minutes: number,
  timeZone: string,
): { from: number; to: number } {
  const from = Temporal.PlainDateTime.from(`${day}T${starts}`).toZonedDateTime(timeZone).epochMilliseconds;
  return { from, to: from + minutes * 60_000 };
}

/** The ISO date that an instant falls on in a zone. */
export const localDay = (at: number, timeZone: string): string =>
  Temporal.Instant.fromEpochMilliseconds(at).toZonedDateTimeISO(timeZone).toPlainDate().toString();

/** HH:MM of an instant in a zone. */
export const localClock = (at: number, timeZone: string): string =>
  Temporal.Instant.fromEpochMilliseconds(at)
    .toZonedDateTimeISO(timeZone)
    .toPlainTime()
    .toString({ smallestUnit: 'minute' });

/** "2026-06-08 14:05" of an instant in a zone: day and clock by one conversion, which is what costs. */
export function localMinute(at: number, timeZone: string): string {
  const then = Temporal.Instant.fromEpochMilliseconds(at).toZonedDateTimeISO(timeZone).toPlainDateTime();
  return then.toString({ smallestUnit: 'minute' }).replace('T', ' ');
}

/** "10:00" + 75 → "11:15"; runs on past midnight ("23:00" + 120 → "01:00"). Whole minutes; sums, since lists call it a lot. */
export function clockAfter(starts: string, minutes: number): string {
  const [hour = 0, minute = 0] = starts.split(':').map(Number);
  const at = (((hour * 60 + minute + minutes) % 1440) + 1440) % 1440;
  return `${String(Math.floor(at / 60)).padStart(2, '0')}:${String(at % 60).padStart(2, '0')}`;
}

/** True for an IANA zone this runtime knows. */
export function isTimeZone(name: string): boolean {
  try {
    return Boolean(new Intl.DateTimeFormat('en', { timeZone: name }));
  } catch {
    return false;
  }
}
