import { Temporal } from 'temporal-polyfill';

/** Days from one ISO date to another: 2027-06-04 to 2027-06-07 is 3, the other way round −3. */
export const dayOffset = (from: string, to: string): number =>
  Temporal.PlainDate.from(from).until(to, { largestUnit: 'day' }).days;

/** The ISO date so many days later. */
export const dayAfter = (day: string, days: number): string =>
  Temporal.PlainDate.from(day).add({ days }).toString();
