import type { TrackLevel } from './camp-words';

/** The skill ladder's own gates in plain words, for an organiser to take or change. Our design, not a standard. */
export const GATE_IDEAS = {
  start: 'Can sound a note or a chord.',
  clean: 'Single notes on holes 1 to 10, blow and draw; a tune from memory; 2 draw sounds without a bend.',
  bending:
    'On a mid-key harp bends 4 and 1 draw, then 6 and 2, and comes back up; knows 1st and 2nd position.',
  controlled:
    'Starts on, holds for 2 seconds and names each of the 8 draw bends, on one low and one mid key; follows a 12-bar.',
  'full-range':
    'Blow bends on 8, 9 and both of 10 on a low key, one of them on a mid key; 3rd position; steady vibrato and octaves.',
} satisfies Record<TrackLevel, string>;
