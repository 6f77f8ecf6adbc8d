export const TUNINGS = [
  'richter',
  'paddy-richter',
  'country',
  'major-7th',
  'natural-minor',
  'harmonic-minor',
  'solo',
  'tremolo',
] as const;

/** How the reeds are laid out; `richter` is the ordinary ten-hole harp, `solo` the twelve-hole chromatic. */
export type Tuning = (typeof TUNINGS)[number];

type TuningFacts = {
  /** For lists and headings. */
  name: string;
  /** What follows the key in a label: "D country"; nothing for the ordinary harp. */
  suffix: string;
  /** The key is named as a minor one: "Gm natural minor". */
  minor: boolean;
  /** Semitones from hole 1 blow up to the key on the label: 7 where makers print the second position. */
  labelAbove: 0 | 7;
};

/** Which key the makers print on the cover differs by tuning; see the README, "Label and identity". */
export const TUNING_FACTS = {
  richter: { name: 'Richter', suffix: '', minor: false, labelAbove: 0 },
  'paddy-richter': { name: 'Paddy Richter', suffix: 'Paddy Richter', minor: false, labelAbove: 0 },
  country: { name: 'Country', suffix: 'country', minor: false, labelAbove: 0 },
  'major-7th': { name: 'Major 7th', suffix: 'major 7th', minor: false, labelAbove: 0 },
  'natural-minor': { name: 'Natural minor', suffix: 'natural minor', minor: true, labelAbove: 7 },
  'harmonic-minor': { name: 'Harmonic minor', suffix: 'harmonic minor', minor: true, labelAbove: 0 },
  solo: { name: 'Chromatic, 12 holes', suffix: 'chromatic', minor: false, labelAbove: 0 },
  tremolo: { name: 'Tremolo', suffix: 'tremolo', minor: false, labelAbove: 0 },
} satisfies Record<Tuning, TuningFacts>;
