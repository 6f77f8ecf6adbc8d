/** The page of a camp where a thing is mended. */
export type MendPlace = 'details' | 'pictures' | 'tracks' | 'rooms' | 'workshops' | 'timetable';

/** must stands in the way of publishing, should is for the organiser to weigh. */
export type ChecklistLevel = 'must' | 'should';

export type ChecklistItem = {
  code: string;
  level: ChecklistLevel;
  /** Two or three words. */
  title: string;
  /** What is missing, in a sentence; null when all is well. */
  missing: string | null;
  mend: MendPlace;
};
