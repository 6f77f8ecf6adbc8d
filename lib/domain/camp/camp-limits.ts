/** What the forms hold a camp to; wide enough for any that a person would run. */
export const CAMP_LIMITS = {
  days: 31,
  places: 5000,
  tracks: 40,
  rooms: 60,
  instructors: 120,
  workshops: 400,
  needs: 24,
  blocks: 24,
  pictures: 24,
} as const;
