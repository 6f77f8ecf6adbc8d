import 'server-only';

const DAY = 24 * 60 * 60 * 1000;

/** Unused for this long, a session is over; each use in its second half starts the count anew (ASVS 7.3.1). */
export const IDLE_DAYS = 7;
/** However busy, a session is over after this (ASVS 7.3.2). Longer than any camp, so nobody is put out in the middle. */
export const ABSOLUTE_MS = 30 * DAY;
