import { parsePitchClass } from './parse-pitch-class';
import { type PitchClass, pitchClassNumber } from './pitch-class';

/** The key a tune is in. */
export type SongKey = { tonic: PitchClass; minor: boolean };

/** Minor keys go by the name with the shorter key signature: C#m, G#m, but Ebm and Bbm. */
const MINOR_NAMES = ['C', 'C#', 'D', 'Eb', 'E', 'F', 'F#', 'G', 'G#', 'A', 'Bb', 'B'] as const;

/** The letter name of a minor key's tonic, without the m. */
export const minorName = (tonic: PitchClass): string => MINOR_NAMES[pitchClassNumber(tonic)] ?? tonic;

/** `E`, `Gm`, `C#m`. */
export const songKeyName = ({ tonic, minor }: SongKey): string => (minor ? `${minorName(tonic)}m` : tonic);

/** Reads `E`, `Gm`, `G minor`, `Bb major`, `C♯m`; null when it is no key. */
export function parseSongKey(text: string): SongKey | null {
  const match = /^(.*?)\s*(m|min|minor|maj|major)?$/i.exec(text.trim());
  const tonic = parsePitchClass(match?.[1] ?? '');
  if (!tonic) return null;
  // A capital M is read as major, as chord charts have it.
  const mode = match?.[2] ?? '';
  return { tonic, minor: mode === 'm' || /^min/i.test(mode) };
}
