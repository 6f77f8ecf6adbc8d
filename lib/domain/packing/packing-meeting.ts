import type { HarpNeed } from '../harp/harp-ask';
import { compareText } from '../shared/compare-text';

/** One of the attendee's own meetings. Day and times are wall time in the camp's zone; past midnight ends < starts. */
export type PackingMeeting = {
  id: string;
  workshop: string;
  /** ISO date of the day it starts on. */
  day: string;
  /** HH:MM. */
  starts: string;
  ends: string;
  room: string;
  needs: HarpNeed[];
};

const timeKey = ({ day, starts, id }: PackingMeeting): string => `${day} ${starts} ${id}`;

/** By time; at the same time by id, so that the order in which they were read never shows. */
export const compareMeetings = (a: PackingMeeting, b: PackingMeeting): number =>
  compareText(timeKey(a), timeKey(b));
