import { z } from 'zod';
import { CAMP_LIMITS } from '@/lib/domain/camp/camp-limits';
import { WORKSHOP_AUDIENCES, WORKSHOP_KINDS } from '@/lib/domain/timetable/workshop-words';
import { harpNeedSchema } from './harp';
import { lineText, proseText } from './line-text';
import { rowId } from './row-id';
import { optionalWholeNumber, wholeNumber } from './whole-number';

/** A workshop; without an id a new one. */
export const workshopSchema = z
  .object({
    campId: rowId('cmp'),
    workshopId: rowId('wsh').optional(),
    /** The row's mark when the form was opened; without one nothing is compared. */
    seen: z.string().max(64).optional(),
    title: lineText('Title', 100, 'Say what is taught or played, like Bends in 2nd position.'),
    description: proseText('Description', 3000),
    kind: z.enum(WORKSHOP_KINDS, { error: 'Kind is not chosen. Choose what it is.' }),
    audience: z.enum(WORKSHOP_AUDIENCES, {
      error: 'Say who comes: a track, those who choose it, or everyone.',
    }),
    lengthMinutes: wholeNumber('Length', 10, 480),
    /** Null is as many as the room seats. */
    capacity: optionalWholeNumber('People at most', 1, CAMP_LIMITS.places),
    trackIds: z.array(rowId('trk')).max(CAMP_LIMITS.tracks).default([]),
    instructorIds: z.array(rowId('ins')).max(CAMP_LIMITS.instructors).default([]),
    needs: z
      .array(harpNeedSchema)
      .max(CAMP_LIMITS.needs, `Name at most ${CAMP_LIMITS.needs} harps for one workshop.`)
      .default([]),
  })
  .refine(({ audience, trackIds }) => audience !== 'core' || trackIds.length > 0, {
    path: ['trackIds'],
    error: 'A core workshop comes with a track, and none is ticked. Tick one or more.',
    when: ({ value }) => (value as { audience?: unknown }).audience === 'core',
  });
export type WorkshopInput = z.output<typeof workshopSchema>;

export const workshopRowSchema = z.object({ campId: rowId('cmp'), workshopId: rowId('wsh') });
export type WorkshopRowInput = z.output<typeof workshopRowSchema>;
