import { z } from 'zod';
import { lineText, proseText } from './line-text';
import { rowId } from './row-id';

/** An instructor of one camp; without an id a new one. */
export const instructorSchema = z.object({
  campId: rowId('cmp'),
  instructorId: rowId('ins').optional(),
  name: lineText('Name', 100, 'Give the name that players read.'),
  bio: proseText('About', 1500),
  /** The account that sees this instructor's own meetings. */
  userId: rowId('usr').optional(),
});
export type InstructorInput = z.output<typeof instructorSchema>;

export const instructorRowSchema = z.object({ campId: rowId('cmp'), instructorId: rowId('ins') });
export type InstructorRowInput = z.output<typeof instructorRowSchema>;
