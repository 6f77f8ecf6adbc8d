import { z } from 'zod';
import { type CampId, type Id, type IdPrefix, isId } from '@/lib/domain/shared/ids';

const CLOCK = /^([01]\d|2[0-3]):[0-5]\d$/;
const idOf = <P extends IdPrefix>(prefix: P, message: string) =>
  z.string({ error: message }).refine((text): text is Id<P> => isId(prefix, text), message);
const clock = (message: string) => z.string().regex(CLOCK, message);
const isDay = (text: string): boolean =>
  /^\d{4}-\d{2}-\d{2}$/.test(text) && new Date(`${text}T00:00Z`).toISOString().startsWith(text);
const safely = (test: (text: string) => boolean) => (text: string) => {
  try {
    return test(text);
  } catch {
    return false;
  }
};

/** The filters of the page one came from, so that a redirect can keep them; read again by name, never trusted. */
const view = z.string().max(400).optional();
const campId = z.string().refine((text): text is CampId => isId('cmp', text), 'This camp is not known.');

const slot = {
  day: z
    .string({ error: 'Day: choose one of the camp’s days.' })
    .refine(safely(isDay), 'Day: choose one of the camp’s days.'),
  block: clock('Block: choose one of the list.').optional(),
  /** A start of its own; wins over the block. */
  time: clock('Time: write it as 09:30, in hours and minutes.').optional(),
  roomId: idOf('rom', 'Room: choose one of the list.'),
  lengthMinutes: z.coerce
    .number({ error: 'Length: write minutes as a whole number, such as 75.' })
    .int('Length: write minutes as a whole number, such as 75.')
    .min(5, 'Length: at least 5 minutes.')
    .max(720, 'Length: at most 720 minutes.')
    .optional(),
};
const NO_START = 'Block: choose one, or give a time below it.';
type Start = { block?: string; time?: string };
const hasStart = ({ block, time }: Start) => Boolean(time ?? block);
const withStart = <T extends Start>({ block, time, ...rest }: T) => ({
  ...rest,
  starts: time ?? block ?? '',
});

export const placeMeetingSchema = z
  .object({ campId, view, workshopId: idOf('wsh', 'Workshop: choose one of the list.'), ...slot })
  .refine(hasStart, { path: ['block'], message: NO_START })
  .transform(withStart);
export type PlaceMeetingInput = z.output<typeof placeMeetingSchema>;

const known = {
  meetingId: idOf('mtg', 'This meeting is not known.'),
  /** As it was when the page was opened: a change by someone else since then is not overwritten. */
  updatedAt: z.coerce.number().int(),
};
export const moveMeetingSchema = z
  .object({ campId, view, ...known, ...slot })
  .refine(hasStart, { path: ['block'], message: NO_START })
  .transform(withStart);
export type MoveMeetingInput = z.output<typeof moveMeetingSchema>;

export const removeMeetingSchema = z.object({ campId, view, ...known });
export type RemoveMeetingInput = z.output<typeof removeMeetingSchema>;
