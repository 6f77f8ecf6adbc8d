/** The twelve keys by the names players use for them, from C upwards. One name a key: Gb is F#, C# is Db. */
export const PITCH_CLASSES = ['C', 'Db', 'D', 'Eb', 'E', 'F', 'F#', 'G', 'Ab', 'A', 'Bb', 'B'] as const;

/** A note without its octave, and so the key of a harp or a song. */
export type PitchClass = (typeof PITCH_CLASSES)[number];

/** Semitones above C, 0 to 11. */
export const pitchClassNumber = (key: PitchClass): number => PITCH_CLASSES.indexOf(key);

/** Any whole number of semitones above C; 12 is C again and −1 is B. */
export function pitchClassAt(semitones: number): PitchClass {
  const key = PITCH_CLASSES[((semitones % 12) + 12) % 12];
  if (!key) throw new RangeError(`Not a whole number of semitones: ${semitones}`);
  return key;
}

/** `transposeKey('E', 5)` → A. */
export const transposeKey = (key: PitchClass, semitones: number): PitchClass =>
  pitchClassAt(pitchClassNumber(key) + semitones);
