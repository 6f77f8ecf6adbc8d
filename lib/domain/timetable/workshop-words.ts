export const WORKSHOP_KINDS = [
  'technique',
  'theory',
  'band-lab',
  'jam',
  'repair-bench',
  'one-to-one',
  'open-mic',
  'concert',
] as const;
export type WorkshopKind = (typeof WORKSHOP_KINDS)[number];

export const KIND_WORDS = {
  technique: 'Technique class',
  theory: 'Theory',
  'band-lab': 'Band lab',
  jam: 'Jam',
  'repair-bench': 'Repair bench',
  'one-to-one': 'One-to-one',
  'open-mic': 'Open mic',
  concert: 'Concert',
} satisfies Record<WorkshopKind, string>;

export const WORKSHOP_AUDIENCES = ['core', 'elective', 'everyone'] as const;
/** core: comes with its tracks · elective: chosen · everyone: concerts, open jams, no choice to make. */
export type WorkshopAudience = (typeof WORKSHOP_AUDIENCES)[number];

export const AUDIENCE_WORDS = {
  core: 'Core workshop of a track',
  elective: 'Elective',
  everyone: 'For everyone',
} satisfies Record<WorkshopAudience, string>;
