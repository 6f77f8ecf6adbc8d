/** Repeatable numbers for the demo (Mulberry32): the same seed gives the same camp on every machine. */
export function seededRandom(seed: number) {
  let state = seed >>> 0;
  const next = (): number => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
  return {
    next,
    /** Whole number from 0 to `below` − 1. */
    below: (below: number): number => Math.floor(next() * below),
    pick: <T>(from: readonly T[]): T => {
      const picked = from[Math.floor(next() * from.length)];
      if (picked === undefined) throw new Error('Nothing to pick from');
      return picked;
    },
    chance: (share: number): boolean => next() < share,
  };
}

export type SeededRandom = ReturnType<typeof seededRandom>;
