import type { HarpAsk } from '@/lib/domain/harp/harp-ask';
import { parsePitchClass } from '@/lib/domain/harp/parse-pitch-class';
import { POSITIONS } from '@/lib/domain/harp/position';
import { REGISTERS } from '@/lib/domain/harp/register';
import { parseSongKey, songKeyName } from '@/lib/domain/harp/song-key';
import { TUNINGS } from '@/lib/domain/harp/tuning';

/** An ask as its fields hold it while somebody types. */
export type TypedAsk = {
  by?: string;
  labelKey?: string;
  songKey?: string;
  position?: string;
  tuning?: string;
  register?: string;
};

/** The ask that the fields mean so far; null while something is missing. The server judges with its own schema. */
export function readTypedAsk(typed: TypedAsk | undefined): HarpAsk | null {
  const tuning = TUNINGS.find((name) => name === typed?.tuning);
  const register = REGISTERS.find((name) => name === typed?.register);
  if (!typed || !tuning || !register) return null;
  if (typed.by === 'harp') {
    const labelKey = parsePitchClass(typed.labelKey ?? '');
    return labelKey && { by: 'harp', labelKey, tuning, register };
  }
  const songKey = parseSongKey(typed.songKey ?? '');
  const position = POSITIONS.find((number) => String(number) === typed.position);
  return songKey && position ? { by: 'song', songKey, position, tuning, register } : null;
}

/** What the fields of a stored ask begin with. */
export function toTypedAsk(ask: HarpAsk): Required<Pick<TypedAsk, 'by' | 'tuning' | 'register'>> & TypedAsk {
  const { by, tuning, register } = ask;
  return ask.by === 'harp'
    ? { by, labelKey: ask.labelKey, tuning, register }
    : { by, songKey: songKeyName(ask.songKey), position: String(ask.position), tuning, register };
}

/** An alternative that was just added: the commonest question of the trade. */
export const NEW_ASK = { by: 'harp', tuning: 'richter', register: 'standard' } satisfies TypedAsk;
