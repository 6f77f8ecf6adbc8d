import { z } from 'zod';
import { CAMP_LIMITS } from '@/lib/domain/camp/camp-limits';
import { TRACK_LEVELS } from '@/lib/domain/camp/camp-words';
import { lineText, optionalLine, proseText } from './line-text';
import { rowId } from './row-id';
import { wholeNumber } from './whole-number';

/** A track; without an id a new one. */
export const trackSchema = z.object({
  campId: rowId('cmp'),
  trackId: rowId('trk').optional(),
  /** The row's mark when the form was opened; without one nothing is compared. */
  seen: z.string().max(64).optional(),
  name: lineText('Name', 60, 'Give the track a name, like Bending.'),
  level: z.enum(TRACK_LEVELS, { error: 'Level is not chosen. Choose the step of the ladder it is for.' }),
  gate: proseText('Gate', 500),
  capacity: wholeNumber('Places', 0, CAMP_LIMITS.places),
  /** As typed; empty takes the camp's price. */
  price: optionalLine('Price', 20),
});
export type TrackInput = z.output<typeof trackSchema>;

export const trackRowSchema = z.object({ campId: rowId('cmp'), trackId: rowId('trk') });
export type TrackRowInput = z.output<typeof trackRowSchema>;
