import type { PitchClass } from './pitch-class';
import type { Position } from './position';
import type { Register } from './register';
import type { SongKey } from './song-key';
import type { Tuning } from './tuning';

/** One harp a workshop names: by the key on its cover, or by a song and the position it is played in. */
export type HarpAsk =
  | { by: 'harp'; labelKey: PitchClass; tuning: Tuning; register: Register }
  | { by: 'song'; songKey: SongKey; position: Position; tuning: Tuning; register: Register };

export const NEED_LEVELS = ['required', 'helpful'] as const;
export type NeedLevel = (typeof NEED_LEVELS)[number];

/**
 * One thing to bring. Any one of the alternatives will do ("A, or D"); two harps are two needs. No alternative at all
 * means that any key will do: it asks for no harp in particular and puts none on a packing list.
 */
export type HarpNeed = { level: NeedLevel; anyOf: HarpAsk[]; note?: string };

export const isAnyKey = (need: Pick<HarpNeed, 'anyOf'>): boolean => need.anyOf.length === 0;
