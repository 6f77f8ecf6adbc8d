import { z } from 'zod';
import { CAMP_LIMITS } from '@/lib/domain/camp/camp-limits';
import { ROOM_LOUDNESS } from '@/lib/domain/camp/camp-words';
import { lineText, optionalLine } from './line-text';
import { rowId } from './row-id';
import { wholeNumber } from './whole-number';

/** A room; without an id a new one. */
export const roomSchema = z.object({
  campId: rowId('cmp'),
  roomId: rowId('rom').optional(),
  name: lineText('Name', 60, 'Give the room a name, like Barn.'),
  seats: wholeNumber('Seats', 1, CAMP_LIMITS.places),
  loudness: z.enum(ROOM_LOUDNESS, {
    error: 'Loudness is not chosen. Choose the loudest that the room can take.',
  }),
  kit: optionalLine('Kit', 300),
});
export type RoomInput = z.output<typeof roomSchema>;

export const roomRowSchema = z.object({ campId: rowId('cmp'), roomId: rowId('rom') });
export type RoomRowInput = z.output<typeof roomRowSchema>;
