import type { Tuning } from './tuning';

/** Semitones above hole 1 blow, hole 1 first. Bends are worked out from the reeds, never listed. */
export type TuningLayout = {
  blow: readonly number[];
  draw: readonly number[];
  bends: boolean;
  slide: boolean;
};

const RICHTER = {
  blow: [0, 4, 7, 12, 16, 19, 24, 28, 31, 36],
  draw: [2, 7, 11, 14, 17, 21, 23, 26, 29, 33],
  bends: true,
  slide: false,
} as const satisfies TuningLayout;

/** Semitones added to named holes: `{ 5: 1 }` is hole 5 up a half step. */
type Change = Partial<Record<number, number>>;

const retune = (reeds: readonly number[], change: Change): number[] =>
  reeds.map((reed, index) => reed + (change[index + 1] ?? 0));

const fromRichter = ({ blow = {}, draw = {} }: { blow?: Change; draw?: Change }): TuningLayout => ({
  ...RICHTER,
  blow: retune(RICHTER.blow, blow),
  draw: retune(RICHTER.draw, draw),
});

/**
 * Each tuning as its change from Richter. Sources in the README. Tremolo is null: its holes are laid out differently
 * from maker to maker, so it is known by its own key and has no note map here.
 */
export const TUNING_LAYOUTS = {
  richter: RICHTER,
  'paddy-richter': fromRichter({ blow: { 3: 2 } }),
  country: fromRichter({ draw: { 5: 1 } }),
  'major-7th': fromRichter({ draw: { 5: 1, 9: 1 } }),
  'natural-minor': fromRichter({ blow: { 2: -1, 5: -1, 8: -1 }, draw: { 3: -1, 7: -1 } }),
  'harmonic-minor': fromRichter({ blow: { 2: -1, 5: -1, 8: -1 }, draw: { 6: -1, 10: -1 } }),
  solo: {
    blow: [0, 4, 7, 12, 12, 16, 19, 24, 24, 28, 31, 36],
    draw: [2, 5, 9, 11, 14, 17, 21, 23, 26, 29, 33, 35],
    bends: false,
    slide: true,
  },
  tremolo: null,
} satisfies Record<Tuning, TuningLayout | null>;
