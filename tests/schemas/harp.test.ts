import { describe, expect, test } from 'vitest';
import {
  a4Schema,
  harpAskSchema,
  harpIdSchema,
  harpNeedSchema,
  ownedHarpsSchema,
  pitchClassSchema,
  positionSchema,
} from '@/lib/schemas/harp';

/** Messages by path, as a form shows them. */
const problems = (result: { error?: { issues: { path: PropertyKey[]; message: string }[] } }) =>
  Object.fromEntries((result.error?.issues ?? []).map(({ path, message }) => [path.join('.'), message]));

describe('a need as a form sends it', () => {
  test('any spelling in, our names out', () => {
    const need = harpNeedSchema.parse({
      level: 'required',
      anyOf: [
        { by: 'song', songKey: 'c♯ minor', position: '3' },
        { by: 'harp', labelKey: 'Gb', tuning: 'natural-minor', register: 'low' },
      ],
      note: '  for the duet ',
    });
    expect(need).toEqual({
      level: 'required',
      anyOf: [
        {
          by: 'song',
          songKey: { tonic: 'Db', minor: true },
          position: 3,
          tuning: 'richter',
          register: 'standard',
        },
        { by: 'harp', labelKey: 'F#', tuning: 'natural-minor', register: 'low' },
      ],
      note: 'for the duet',
    });
    expect(harpNeedSchema.parse(need)).toEqual(need);
  });

  test('each field says what is wrong with its value and what to use', () => {
    const result = harpNeedSchema.safeParse({
      level: 'nice',
      anyOf: [
        { by: 'harp', labelKey: 'H', tuning: 'blues', register: '' },
        { by: 'song', songKey: 'X minor', position: '13' },
        { by: 'song' },
        { labelKey: 'C' },
      ],
      note: 'n'.repeat(201),
    });
    expect(problems(result)).toEqual({
      level: '“nice” is not a level. Use required or helpful.',
      'anyOf.0.labelKey': '“H” is not a key. Use one of C, Db, D, Eb, E, F, F#, G, Ab, A, Bb, B.',
      'anyOf.0.tuning':
        '“blues” is not a tuning we know. Use one of richter, paddy-richter, country, major-7th, natural-minor, harmonic-minor, solo, tremolo.',
      'anyOf.0.register': '“” is not a register. Use low, standard or high.',
      'anyOf.1.songKey':
        '“X minor” is not a key for a song. Use one of C, Db, D, Eb, E, F, F#, G, Ab, A, Bb, B, with an m after it for a minor key (Gm).',
      'anyOf.1.position': '“13” is not a position. Use a number from 1 to 12.',
      'anyOf.2.songKey': 'Give the key the song is in, for example E or Gm.',
      'anyOf.2.position': 'Choose a position from 1 to 12.',
      'anyOf.3.by': 'Say whether the harp is named by its own key or by a song and a position.',
      note: 'Keep the note to 200 characters.',
    });
  });

  test('no alternative is any key; more than twelve are refused', () => {
    expect(harpNeedSchema.parse({ level: 'helpful', anyOf: [] }).anyOf).toEqual([]);
    const many = Array(13).fill({ by: 'harp', labelKey: 'C' });
    expect(problems(harpNeedSchema.safeParse({ level: 'helpful', anyOf: many })).anyOf).toContain(
      'at most 12',
    );
  });

  test('fields that are not ours are dropped', () => {
    expect(harpAskSchema.parse({ by: 'harp', labelKey: 'A', price: 0 })).not.toHaveProperty('price');
  });
});

test('a message repeats what was typed, cut short', () => {
  const message = problems(pitchClassSchema.safeParse('x'.repeat(5000)))[''] ?? '';
  expect(message.length).toBeLessThan(120);
});

test.each([1.5, 0, 13, '2.0', 'two', null, true])('%j is no position', (input) =>
  expect(positionSchema.safeParse(input).success).toBe(false),
);

test('A4 from 440 to 446 Hz', () => {
  expect(a4Schema.parse('443')).toBe(443);
  expect(a4Schema.parse(440)).toBe(440);
  for (const input of ['439.9', 447, '', ' ', 'abc', null, 'NaN', 'Infinity'])
    expect(a4Schema.safeParse(input).success).toBe(false);
});

test('owned harps: one spelling, each once, and no other thing', () => {
  expect(ownedHarpsSchema.parse(['Gb-richter-low', 'F#-richter-low', 'C-richter-standard'])).toEqual([
    'Fs-richter-low',
    'C-richter-standard',
  ]);
  expect(problems(harpIdSchema.safeParse('C'))['']).toBe(
    '“C” is not a harp. It should look like C-richter-standard.',
  );
});
