import { describe, expect, test } from 'vitest';
import { askSentence } from '@/lib/domain/harp/ask-sentence';
import { compareHarps } from '@/lib/domain/harp/compare-harps';
import { coverHint } from '@/lib/domain/harp/cover-hint';
import { effortBand } from '@/lib/domain/harp/effort-band';
import type { Harp } from '@/lib/domain/harp/harp';
import { harpId, parseHarpId } from '@/lib/domain/harp/harp-id';
import { harpFromLabel, harpLabel } from '@/lib/domain/harp/harp-label';
import { holeOneMidi } from '@/lib/domain/harp/hole-one';
import { needHarps } from '@/lib/domain/harp/need-harps';
import { needSentence } from '@/lib/domain/harp/need-sentence';
import { parseHarpLabel } from '@/lib/domain/harp/parse-harp-label';
import { parsePitchClass } from '@/lib/domain/harp/parse-pitch-class';
import { PITCH_CLASSES } from '@/lib/domain/harp/pitch-class';
import { REGISTERS } from '@/lib/domain/harp/register';
import { parseSongKey, songKeyName } from '@/lib/domain/harp/song-key';
import { spokenName } from '@/lib/domain/harp/spoken-name';
import { tabName } from '@/lib/domain/harp/tab-name';
import { TUNINGS } from '@/lib/domain/harp/tuning';

const ALL: Harp[] = PITCH_CLASSES.flatMap((root) =>
  TUNINGS.flatMap((tuning) => REGISTERS.map((register) => ({ root, tuning, register }))),
);

describe('keys as people type them', () => {
  test.each([
    ['C', 'C'],
    [' bb ', 'Bb'],
    ['B♭', 'Bb'],
    ['b flat', 'Bb'],
    ['a#', 'Bb'],
    ['F#', 'F#'],
    ['Fs', 'F#'],
    ['F♯', 'F#'],
    ['f sharp', 'F#'],
    ['Gb', 'F#'],
    ['C#', 'Db'],
    ['D♭', 'Db'],
    ['Cb', 'B'],
    ['E#', 'F'],
    ['B#', 'C'],
    ['Fb', 'E'],
  ])('%j is %s', (text, key) => expect(parsePitchClass(text)).toBe(key));

  test.each(['', 'H', 'Es', 'As', 'C##', 'Bbb', 'C major', 'do', '1', '<b>C</b>', 'C\n#x'])(
    '%j is no key',
    (text) => expect(parsePitchClass(text)).toBeNull(),
  );

  test.each([
    ['Gm', 'Gm'],
    ['G minor', 'Gm'],
    ['g min', 'Gm'],
    ['Abm', 'G#m'],
    ['Dbm', 'C#m'],
    ['C♯m', 'C#m'],
    ['Bbm', 'Bbm'],
    ['Bb', 'Bb'],
    ['B♭ major', 'Bb'],
    ['CM', 'C'],
  ])('song key %j is %s', (text, name) => {
    const key = parseSongKey(text);
    expect(key && songKeyName(key)).toBe(name);
  });

  test.each(['', 'm', 'minor', 'Hm', 'Gmm', 'G dorian'])('%j is no song key', (text) =>
    expect(parseSongKey(text)).toBeNull(),
  );
});

describe('label and identity', () => {
  test('a natural minor is labelled in 2nd position: Gm has C on hole 1 (encyclopaedia, “Richter tuning”)', () => {
    const harp = harpFromLabel({ labelKey: 'G', tuning: 'natural-minor', register: 'standard' });
    expect(harp.root).toBe('C');
    expect(harpLabel(harp)).toBe('Gm natural minor');
    expect(harpId(harp)).toBe('C-natural-minor-standard');
  });

  test.each([
    ['A', 'A-richter-standard'],
    ['low F', 'F-richter-low'],
    ['High G', 'G-richter-high'],
    ['Gb', 'Fs-richter-standard'],
    ['Bb country', 'Bb-country-standard'],
    ['D Paddy Richter', 'D-paddy-richter-standard'],
    ['D major 7th', 'D-major-7th-standard'],
    ['D major-7th', 'D-major-7th-standard'],
    ['Low Cm harmonic minor', 'C-harmonic-minor-low'],
    ['Am natural minor harp', 'D-natural-minor-standard'],
    ['A natural minor', 'D-natural-minor-standard'],
    ['C chromatic', 'C-solo-standard'],
    ['c tremolo', 'C-tremolo-standard'],
  ])('%j is %s', (text, id) => {
    const harp = parseHarpLabel(text);
    expect(harp && harpId(harp)).toBe(id);
  });

  test.each(['', 'Gm', 'Am country', 'low', 'Low Low F', 'X country', 'A unknown', 'natural minor'])(
    '%j names no harp',
    (text) => expect(parseHarpLabel(text)).toBeNull(),
  );

  test('every harp comes back from its label and from its id, and no two share either', () => {
    for (const harp of ALL) {
      expect(parseHarpLabel(harpLabel(harp))).toEqual(harp);
      expect(parseHarpId(harpId(harp))).toEqual(harp);
    }
    expect(new Set(ALL.map(harpLabel)).size).toBe(ALL.length);
    expect(new Set(ALL.map(harpId)).size).toBe(ALL.length);
  });

  test('ids need no escaping in an address', () => {
    for (const harp of ALL) expect(encodeURIComponent(harpId(harp))).toBe(harpId(harp));
  });

  test.each(['', 'C', 'C-richter', 'C-richter-deep', 'C-blues-low', 'H-richter-low', 'C-richter-low-x'])(
    '%j is no id',
    (text) => expect(parseHarpId(text)).toBeNull(),
  );
});

test('pitch order of the twelve keys, G lowest, F# highest (encyclopaedia, “Richter-tuned harmonica”), Low F just below G', () => {
  const harps = ['F#', 'C', 'Low F', 'F', 'E', 'G', 'Ab', 'A', 'Bb', 'B', 'Db', 'D', 'Eb'].flatMap(
    (label) => parseHarpLabel(label) ?? [],
  );
  expect(harps.sort(compareHarps).map((harp) => [harpLabel(harp), holeOneMidi(harp)])).toEqual([
    ['Low F', 53],
    ['G', 55],
    ['Ab', 56],
    ['A', 57],
    ['Bb', 58],
    ['B', 59],
    ['C', 60],
    ['Db', 61],
    ['D', 62],
    ['Eb', 63],
    ['E', 64],
    ['F', 65],
    ['F#', 66],
  ]);
});

test('at one pitch the ordinary tuning comes first', () => {
  const labels = ['C tremolo', 'Gm natural minor', 'C', 'C country'];
  const sorted = labels.flatMap((label) => parseHarpLabel(label) ?? []).sort(compareHarps);
  expect(sorted.map(harpLabel)).toEqual(['C', 'C country', 'Gm natural minor', 'C tremolo']);
});

test('effort bands (our own): 55–59 low, 60–63 mid, 64–66 high, other registers with their neighbours', () => {
  const band = (label: string) =>
    effortBand(parseHarpLabel(label) ?? { root: 'C', tuning: 'solo', register: 'low' });
  expect(['Low D', 'G', 'B', 'C', 'Eb', 'E', 'F#', 'High G'].map(band)).toEqual([
    ...['low', 'low', 'low', 'mid', 'mid', 'high', 'high', 'high'],
  ]);
});

describe('sentences', () => {
  const usual = { tuning: 'richter', register: 'standard' } as const;
  test('a song shows both keys', () => {
    expect(askSentence({ by: 'song', songKey: { tonic: 'E', minor: false }, position: 2, ...usual })).toBe(
      'song in E, 2nd position → A harp',
    );
    expect(askSentence({ by: 'song', songKey: { tonic: 'G', minor: true }, position: 3, ...usual })).toBe(
      'song in Gm, 3rd position → F harp',
    );
    expect(
      askSentence({
        by: 'song',
        songKey: { tonic: 'G', minor: true },
        position: 2,
        tuning: 'natural-minor',
        register: 'low',
      }),
    ).toBe('song in Gm, 2nd position → Low Gm natural minor harp');
  });

  test('a harp named by its key', () => {
    expect(askSentence({ by: 'harp', labelKey: 'F', tuning: 'richter', register: 'low' })).toBe('Low F harp');
  });

  test('a need names its alternatives, its level and its note; its harps are each once, low to high', () => {
    const e2 = { by: 'song', songKey: { tonic: 'E', minor: false }, position: 2, ...usual } as const;
    const a = { by: 'harp', labelKey: 'A', ...usual } as const;
    const g = { by: 'harp', labelKey: 'G', ...usual } as const;
    expect(needSentence({ level: 'helpful', anyOf: [e2, g], note: 'for the duet' })).toBe(
      'song in E, 2nd position → A harp or G harp (helpful): for the duet',
    );
    expect(needSentence({ level: 'required', anyOf: [] })).toBe('a harp of any key');
    expect(needHarps({ anyOf: [e2, a, g] }).map(harpLabel)).toEqual(['G', 'A']);
    expect(needHarps({ anyOf: [] })).toEqual([]);
  });

  test('for the ear', () => {
    expect(spokenName('Bb')).toBe('B flat');
    expect(spokenName('Low F#')).toBe('Low F sharp');
    expect(spokenName('song in C#m, 2nd position → F# harp')).toBe(
      'song in C sharp minor, 2nd position → F sharp harp',
    );
    expect(spokenName('Take Bb: one harp serves Fri 5 June 10:00 and Band lab')).toBe(
      'Take B flat: one harp serves Fri 5 June 10:00 and Band lab',
    );
  });

  test('what to look for on the cover; nothing for the ordinary harp', () => {
    const hint = (label: string) =>
      coverHint(parseHarpLabel(label) ?? { root: 'C', tuning: 'solo', register: 'low' });
    expect(hint('A')).toBeNull();
    expect(hint('Low F')).toBe('An octave below the ordinary harp of this key: look for “Low” on the cover.');
    expect(hint('Gm natural minor')).toContain('Hole 1 blow sounds C');
  });

  test('tab', () => {
    expect(tabName({ hole: 4, breath: 'blow' })).toBe('+4');
    expect(tabName({ hole: 3, breath: 'draw', depth: 3 })).toBe("−3'''");
    expect(tabName({ hole: 6, breath: 'blow', overbend: true })).toBe('+6o');
  });
});
