import { z } from 'zod';
import { clockText } from './day-and-clock';
import { optionalLine } from './line-text';
import { rowId } from './row-id';

/** A time of day in the grid; without an id a new one. An end before the start runs past midnight. */
export const blockSchema = z
  .object({
    campId: rowId('cmp'),
    blockId: rowId('blk').optional(),
    starts: clockText('From'),
    ends: clockText('Until'),
    label: optionalLine('Name', 40),
  })
  .refine(({ starts, ends }) => starts !== ends, {
    path: ['ends'],
    error: 'Until is the same as from. Give a later time; one after midnight counts for the same evening.',
  });
export type BlockInput = z.output<typeof blockSchema>;

export const blockRowSchema = z.object({ campId: rowId('cmp'), blockId: rowId('blk') });
export type BlockRowInput = z.output<typeof blockRowSchema>;
