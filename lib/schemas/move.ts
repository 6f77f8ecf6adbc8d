import { z } from 'zod';
import { rowId } from './row-id';

const towards = z.enum(['up', 'down'], { error: 'Say up or down.' });

/** One row of an ordered list of a camp goes up or down by one place. */
export const moveRowSchema = z.discriminatedUnion(
  'list',
  [
    z.object({ list: z.literal('tracks'), campId: rowId('cmp'), id: rowId('trk'), towards }),
    z.object({ list: z.literal('rooms'), campId: rowId('cmp'), id: rowId('rom'), towards }),
    z.object({ list: z.literal('instructors'), campId: rowId('cmp'), id: rowId('ins'), towards }),
    z.object({ list: z.literal('pictures'), campId: rowId('cmp'), id: rowId('pic'), towards }),
  ],
  { error: 'Say which list: tracks, rooms, instructors or pictures.' },
);
export type MoveRowInput = z.output<typeof moveRowSchema>;
