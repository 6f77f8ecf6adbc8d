export const HOLES = 10;

/**
 * Holes filled when so many places are gone: the first place sold shows, and the last hole fills only with the last
 * place. Nothing to sell is a full strip.
 */
export function filledHoles(left: number, of: number): number {
  if (of <= 0 || left <= 0) return HOLES;
  if (left >= of) return 0;
  return Math.min(HOLES - 1, Math.max(1, Math.floor(((of - left) / of) * HOLES)));
}
