import type { Breath, Hole } from './hole';

/** One thing to play. Depth in semitones, 0 unbent. */
export type Played = { hole: Hole; breath: Breath; depth?: number; overbend?: boolean };

/** Tab as this product prints it: `+4` blow, `−4` draw, `'` a semitone of bend, `o` an overbend: `−3''`, `+4o`. */
export function tabName({ hole, breath, depth = 0, overbend = false }: Played): string {
  return `${breath === 'blow' ? '+' : '−'}${hole}${overbend ? 'o' : "'".repeat(depth)}`;
}

/** To print wherever tab stands: systems differ, and a bare number is read both ways. */
export const TAB_LEGEND =
  "+4 is hole 4 blow, −4 is hole 4 draw, each ' bends it a half step lower, o is an overbend.";
