import { Temporal } from 'temporal-polyfill';
import { z } from 'zod';

/** An ISO date that exists, in this century. */
export function isDayText(text: string): boolean {
  if (!/^20\d{2}-\d{2}-\d{2}$/.test(text)) return false;
  try {
    return Boolean(Temporal.PlainDate.from(text, { overflow: 'reject' }));
  } catch {
    return false;
  }
}

/** An ISO date that exists: 2026-02-30 is refused, not moved. */
export const dayText = (field: string) =>
  z
    .string({ error: `${field} is empty. Give a date.` })
    .trim()
    .min(1, `${field} is empty. Give a date.`)
    .refine(isDayText, {
      error: ({ input }) =>
        `${field}: “${String(input).slice(0, 20)}” is no date we can use. Write it as year-month-day, like 2027-06-04.`,
    });

/** A time of day, HH:MM on a 24-hour clock. */
export const clockText = (field: string) =>
  z
    .string({ error: `${field} is empty. Give a time, like 09:30.` })
    .trim()
    .min(1, `${field} is empty. Give a time, like 09:30.`)
    .regex(/^([01]\d|2[0-3]):[0-5]\d$/, {
      error: ({ input }) =>
        `${field}: “${String(input).slice(0, 20)}” is no time of day. Write hours and minutes, like 09:30 or 20:00.`,
    });
