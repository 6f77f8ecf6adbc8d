import type { Breath } from '@/lib/domain/harp/hole';
import type { HoleNotes } from '@/lib/domain/harp/note-map';
import type { Played } from '@/lib/domain/harp/tab-name';

/** What is heard right now, and how far it lies above its target in cents. */
export type Sounding = Played & { cents: number };

/** One note of a hole's column. `out` counts rows away from the strip, 0 the unbent reed. */
export type Cell = {
  kind: 'reed' | 'bend' | 'overbend' | 'slide';
  breath: Breath;
  depth: number;
  note: string;
  out: number;
};

/** A hole's notes on one side of the strip, nearest first. Overbends that gain no note are left out. */
export function noteColumn(hole: HoleNotes, breath: Breath): Cell[] {
  const { bends, overbend, slide } = hole;
  const gained = overbend && !overbend.repeats && overbend.breath === breath ? [overbend] : [];
  const cells: Omit<Cell, 'out' | 'breath'>[] = [
    { kind: 'reed', depth: 0, note: hole[breath].note },
    ...bends
      .filter((bend) => bend.breath === breath)
      .map(({ depth, note }) => ({ kind: 'bend' as const, depth, note })),
    ...gained.map(({ note }) => ({ kind: 'overbend' as const, depth: 0, note })),
    ...(slide ? [{ kind: 'slide' as const, depth: 0, note: slide[breath].note }] : []),
  ];
  return cells.map((cell, out) => ({ ...cell, breath, out }));
}

export const isHeard = (cell: Cell, hole: number, sounding?: Sounding): boolean =>
  sounding?.hole === hole &&
  sounding.breath === cell.breath &&
  (sounding.depth ?? 0) === cell.depth &&
  (sounding.overbend ?? false) === (cell.kind === 'overbend') &&
  cell.kind !== 'slide';
