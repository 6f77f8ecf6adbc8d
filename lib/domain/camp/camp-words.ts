export const CAMP_STATES = ['draft', 'published', 'closed'] as const;
/** draft: organisers only · published: on sale · closed: still shown, sells nothing. */
export type CampState = (typeof CAMP_STATES)[number];

/** The skill ladder, lowest first. */
export const TRACK_LEVELS = ['start', 'clean', 'bending', 'controlled', 'full-range'] as const;
export type TrackLevel = (typeof TRACK_LEVELS)[number];

export const LEVEL_WORDS = {
  start: 'Start',
  clean: 'Clean',
  bending: 'Bending',
  controlled: 'Controlled',
  'full-range': 'Full range',
} satisfies Record<TrackLevel, string>;

export const ROOM_LOUDNESS = ['quiet', 'acoustic', 'amplified'] as const;
/** The loudest that a room can take. */
export type RoomLoudness = (typeof ROOM_LOUDNESS)[number];

export const LOUDNESS_WORDS = {
  quiet: 'Quiet only',
  acoustic: 'Acoustic',
  amplified: 'Amplified',
} satisfies Record<RoomLoudness, string>;
