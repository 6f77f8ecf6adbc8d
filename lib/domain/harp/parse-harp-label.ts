import type { Harp } from './harp';
import { harpFromLabel } from './harp-label';
import type { Register } from './register';
import { parseSongKey } from './song-key';
import { TUNING_FACTS, TUNINGS, type Tuning } from './tuning';

const plain = (text: string): string =>
  text
    .toLowerCase()
    .replace(/[\s_-]+/g, ' ')
    .trim();

/** Longest first, so that "harmonic minor" is not read as the minor of something. */
const SUFFIXES: { words: string; tuning: Tuning }[] = TUNINGS.flatMap((tuning) => [
  { words: plain(TUNING_FACTS[tuning].suffix), tuning },
  { words: plain(tuning), tuning },
])
  .filter(({ words }) => words !== '')
  .sort((a, b) => b.words.length - a.words.length);

/**
 * Reads a label as a person writes it: `A`, `low F`, `F♯`, `Gm natural minor`, `Bb country`. The m of a minor tuning
 * may be left out; an m on any other tuning is refused, since no such harp is sold. Null when it names no harp.
 */
export function parseHarpLabel(text: string): Harp | null {
  let rest = text
    .trim()
    .replace(/\s+/g, ' ')
    .replace(/ ?harp$/i, '');
  let register: Register = 'standard';
  const word = /^(low|high|standard) /i.exec(rest);
  if (word) {
    register = word[1]?.toLowerCase() as Register;
    rest = rest.slice(word[0].length);
  }
  const suffix = SUFFIXES.find(({ words }) => plain(rest).endsWith(` ${words}`));
  if (suffix) rest = rest.slice(0, rest.length - suffix.words.length).replace(/[\s_-]+$/, '');
  const tuning = suffix?.tuning ?? 'richter';
  const key = parseSongKey(rest);
  if (!key || (key.minor && !TUNING_FACTS[tuning].minor)) return null;
  return harpFromLabel({ labelKey: key.tonic, tuning, register });
}
