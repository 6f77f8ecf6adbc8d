import { type PitchClass, pitchClassAt, pitchClassNumber } from './pitch-class';

export const POSITIONS = [1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12] as const;

/** Where a song's key lies on the harp: 1 the harp's own key, each next one a fifth further. */
export type Position = (typeof POSITIONS)[number];

/** Hole-1 root for a song: song − 7·(p − 1) semitones. `positionRoot('E', 2)` → A. */
export const positionRoot = (songTonic: PitchClass, position: Position): PitchClass =>
  pitchClassAt(pitchClassNumber(songTonic) - 7 * (position - 1));

/** The song key that a harp plays in a position. `positionTonic('A', 2)` → E. */
export const positionTonic = (root: PitchClass, position: Position): PitchClass =>
  pitchClassAt(pitchClassNumber(root) + 7 * (position - 1));

/** The position in which a harp of this root plays a song of this key. `positionOf('E', 'A')` → 2. */
export function positionOf(songTonic: PitchClass, root: PitchClass): Position {
  // 7 is its own inverse modulo 12 (7·7 = 49 = 4·12 + 1).
  const steps = ((((pitchClassNumber(songTonic) - pitchClassNumber(root)) * 7) % 12) + 12) % 12;
  return POSITIONS[steps] ?? 1;
}

/** `1st`, `2nd`, `3rd`, `11th`. */
export function positionName(position: Position): string {
  return `${position}${{ 1: 'st', 2: 'nd', 3: 'rd' }[position as number] ?? 'th'}`;
}
