import { z } from 'zod';
import { NEED_LEVELS } from '@/lib/domain/harp/harp-ask';
import { harpId, parseHarpId } from '@/lib/domain/harp/harp-id';
import { parsePitchClass } from '@/lib/domain/harp/parse-pitch-class';
import { PITCH_CLASSES } from '@/lib/domain/harp/pitch-class';
import { POSITIONS } from '@/lib/domain/harp/position';
import { REGISTERS } from '@/lib/domain/harp/register';
import { parseSongKey, type SongKey, songKeyName } from '@/lib/domain/harp/song-key';
import { TUNINGS } from '@/lib/domain/harp/tuning';

const KEYS = PITCH_CLASSES.join(', ');

/** What was typed, cut short: a message repeats it and must stay readable. */
const shown = (input: unknown): string => `“${String(input ?? '').slice(0, 20)}”`;

/** A reader of text as a schema: what `read` returns null for is refused with `message`. */
function read<T>(reader: (text: string) => T | null, message: (text: string) => string) {
  return z.string({ error: ({ input }) => message(String(input ?? '')) }).transform((text, ctx): T => {
    const value = reader(text);
    if (value !== null) return value;
    ctx.addIssue({ code: 'custom', message: message(text), input: text });
    return z.NEVER;
  });
}

/** The key of a harp as a person types it: any spelling in, our name out (`Gb` → `F#`). */
export const pitchClassSchema = read(parsePitchClass, (text) =>
  text.trim() === '' ? `Choose a key: ${KEYS}.` : `${shown(text)} is not a key. Use one of ${KEYS}.`,
);

export const tuningSchema = z.enum(TUNINGS, {
  error: ({ input }) => `${shown(input)} is not a tuning we know. Use one of ${TUNINGS.join(', ')}.`,
});

export const registerSchema = z.enum(REGISTERS, {
  error: ({ input }) => `${shown(input)} is not a register. Use low, standard or high.`,
});

const SONG_KEY_MISSING = 'Give the key the song is in, for example E or Gm.';

/** `Gm`, `E`, `C# minor`, or what this schema gave before (`{ tonic, minor }`), so that a stored ask parses again. */
export const songKeySchema = z
  .union(
    [z.string(), z.object({ tonic: z.enum(PITCH_CLASSES), minor: z.boolean() }).transform(songKeyName)],
    {
      error: SONG_KEY_MISSING,
    },
  )
  .pipe(
    read<SongKey>(parseSongKey, (text) =>
      text.trim() === ''
        ? SONG_KEY_MISSING
        : `${shown(text)} is not a key for a song. Use one of ${KEYS}, with an m after it for a minor key (Gm).`,
    ),
  );

/** 1 to 12, as a number or as a form sends it. */
export const positionSchema = z.preprocess(
  (input) => (typeof input === 'string' && /^\s*\d+\s*$/.test(input) ? Number(input) : input),
  z.literal(POSITIONS, {
    error: ({ input }) =>
      input === undefined || input === ''
        ? 'Choose a position from 1 to 12.'
        : `${shown(input)} is not a position. Use a number from 1 to 12.`,
  }),
);

/** Pitch of A4 in Hz, as a number or as a form sends it; harps are tuned from 440 to 446. */
export const a4Schema = z.preprocess(
  (input) => (typeof input === 'string' && input.trim() !== '' ? Number(input) : input),
  z
    .number({ error: 'Give the pitch of A4 in Hz as a number from 440 to 446.' })
    .min(440, 'A4 is 440 Hz or more: use a number from 440 to 446.')
    .max(446, 'A4 is 446 Hz or less: use a number from 440 to 446.'),
);

/** A harp as a form or an address sends it, canonical on the way out: `Gb-richter-low` → `Fs-richter-low`. */
export const harpIdSchema = read(
  (text) => {
    const harp = parseHarpId(text);
    return harp && harpId(harp);
  },
  (text) => `${shown(text)} is not a harp. It should look like C-richter-standard.`,
);

/** The harps somebody owns: each once. At most as many as there are kinds. */
export const ownedHarpsSchema = z
  .array(harpIdSchema)
  .max(PITCH_CLASSES.length * TUNINGS.length * REGISTERS.length, 'That is more harps than there are kinds.')
  .transform((ids) => [...new Set(ids)]);

const cover = { tuning: tuningSchema.default('richter'), register: registerSchema.default('standard') };

export const harpAskSchema = z.discriminatedUnion(
  'by',
  [
    z.object({ by: z.literal('harp'), labelKey: pitchClassSchema, ...cover }),
    z.object({ by: z.literal('song'), songKey: songKeySchema, position: positionSchema, ...cover }),
  ],
  { error: 'Say whether the harp is named by its own key or by a song and a position.' },
);

/** One thing to bring. No alternative means that any key will do. */
export const harpNeedSchema = z.object({
  level: z.enum(NEED_LEVELS, {
    error: ({ input }) => `${shown(input)} is not a level. Use required or helpful.`,
  }),
  anyOf: z.array(harpAskSchema).max(12, 'Name at most 12 alternatives, or leave it open as any key.'),
  note: z.string().trim().max(200, 'Keep the note to 200 characters.').optional(),
});
