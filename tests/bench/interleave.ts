/** Rounds that count; one more goes first and is dropped, because it warms caches and the compiler. */
export const ROUNDS = 5;

export function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = Math.floor(sorted.length / 2);
  const upper = sorted[middle] ?? Number.NaN;
  return sorted.length % 2 === 1 ? upper : ((sorted[middle - 1] ?? upper) + upper) / 2;
}

type Timed<Name extends string> = Record<Name, number> & {
  /** Median over the rounds of one side divided by another within the same round: noise hits both alike. */
  ratio: (over: Name, under: Name) => number;
};

/** Runs each side once a round, turn by turn in an order that reverses each round; medians of what they return. */
export async function interleave<Name extends string>(
  sides: Record<Name, (round: number) => number | Promise<number>>,
  rounds = ROUNDS,
): Promise<Timed<Name>> {
  const names = Object.keys(sides) as Name[];
  const seen = new Map<Name, number[]>(names.map((name) => [name, []]));
  for (let round = 0; round <= rounds; round += 1) {
    for (const name of round % 2 === 0 ? names : [...names].reverse()) {
      const value = await sides[name](round);
      if (!(value > 0)) throw new Error(`${name} measured ${value}`);
      if (round > 0) seen.get(name)?.push(value);
    }
  }
  const medians = Object.fromEntries(names.map((name) => [name, median(seen.get(name) ?? [])])) as Record<
    Name,
    number
  >;
  return Object.assign(medians, {
    ratio: (over: Name, under: Name) =>
      median((seen.get(over) ?? []).map((value, at) => value / (seen.get(under)?.[at] ?? Number.NaN))),
  }) as Timed<Name>;
}

/** Milliseconds that `run` takes. */
export async function timed(run: () => unknown): Promise<number> {
  const start = performance.now();
  await run();
  return performance.now() - start;
}
