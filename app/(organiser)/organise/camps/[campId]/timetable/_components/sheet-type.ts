import type { Grid } from '@/lib/domain/timetable/build-grid';
import type { Programme } from '@/lib/domain/timetable/programme';

const MM_A_POINT = 0.3528;
/** A4 landscape within its margins, less heading and column heads. */
const SHEET = { width: 280, height: 178, heads: 40 };
const LEADING = 1.15;
/** Mean width of a letter of the text face, in its size. */
const LETTER = 0.52;
const PADDING = 1.3;

/**
 * Points of type at which the whole grid stands on one A4 sheet on its side: the largest at which the lanes in use,
 * each as high as its fullest cell, fit under each other. 4 at least: past that it spills onto a second sheet.
 */
export function sheetType(
  grid: Grid,
  programme: Pick<Programme, 'workshops' | 'tracks' | 'instructors'>,
): number {
  const letters = new Map(
    programme.workshops.map((workshop) => {
      const tracks = programme.tracks
        .filter(({ id }) => workshop.trackIds.includes(id))
        .map(({ name }) => name);
      const people = programme.instructors.filter(({ id }) => workshop.instructorIds.includes(id));
      const harps = workshop.needs.reduce(
        (sum, need) => sum + 2 + need.anyOf.length * 7 + (need.level === 'helpful' ? 10 : 0),
        0,
      );
      return [
        workshop.id,
        {
          first: workshop.title.length * 1.1 + harps,
          second: [...tracks, ...people.map(({ name }) => name)].join(', ').length,
        },
      ];
    }),
  );
  const column = (SHEET.width - SHEET.heads) / Math.max(1, grid.days.length);
  const heightAt = (points: number): number => {
    const size = points * MM_A_POINT;
    const fit = Math.max(1, (column - 3) / (size * LETTER));
    const lines = (count: number) => Math.ceil(count / fit);
    let height = 2 * size;
    for (const { lanes } of grid.rows)
      for (const { cells } of lanes) {
        const each = cells.map(({ meetings }) =>
          meetings.reduce((sum, { workshopId }) => {
            const { first = 0, second = 0 } = letters.get(workshopId) ?? {};
            return sum + (lines(first) + lines(second)) * size * LEADING + PADDING;
          }, 0),
        );
        height += Math.max(0, ...each);
      }
    return height;
  };
  let points = 9;
  while (points > 4 && heightAt(points) > SHEET.height) points -= 0.1;
  return Math.round(points * 10) / 10;
}
