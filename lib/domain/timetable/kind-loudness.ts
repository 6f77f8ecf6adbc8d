import { ROOM_LOUDNESS, type RoomLoudness } from '../camp/camp-words';
import type { WorkshopKind } from './workshop-words';

/** How loud a kind of workshop gets. Common practice of the trade, not a measurement of any room. */
export const KIND_LOUDNESS = {
  technique: 'quiet',
  theory: 'quiet',
  'band-lab': 'amplified',
  jam: 'amplified',
  'repair-bench': 'quiet',
  'one-to-one': 'quiet',
  'open-mic': 'amplified',
  concert: 'amplified',
} satisfies Record<WorkshopKind, RoomLoudness>;

/** A workshop as a card says it. */
export const SOUND_WORDS = {
  quiet: 'Quiet',
  acoustic: 'Acoustic',
  amplified: 'Amplified',
} satisfies Record<RoomLoudness, string>;

/** True when the kind is louder than the room can take. */
export const tooLoudFor = (kind: WorkshopKind, room: RoomLoudness): boolean =>
  ROOM_LOUDNESS.indexOf(KIND_LOUDNESS[kind]) > ROOM_LOUDNESS.indexOf(room);
