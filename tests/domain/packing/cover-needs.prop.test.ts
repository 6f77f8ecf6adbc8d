import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { coverNeeds } from '@/lib/domain/packing/cover-needs';

type Case = { needs: number[][]; weights: number[] };

const cases = (items: number, needs: number): fc.Arbitrary<Case> =>
  fc.integer({ min: 1, max: items }).chain((count) =>
    fc.record({
      needs: fc.array(fc.uniqueArray(fc.nat(count - 1), { minLength: 1, maxLength: 4 }), {
        maxLength: needs,
      }),
      weights: fc.array(fc.integer({ min: 1, max: 5 }), { minLength: count, maxLength: count }),
    }),
  );

const covers = (needs: number[][], chosen: readonly number[]): boolean =>
  needs.every((need) => need.some((item) => chosen.includes(item)));

/** Every subset tried: least weight, then the one whose first difference comes earliest. Knows nothing of the search. */
function bruteForce({ needs, weights }: Case): number[] {
  let best: { weight: number; items: number[] } | null = null;
  for (let mask = 0; mask < 1 << weights.length; mask += 1) {
    const items = weights.flatMap((_, item) => (mask & (1 << item) ? [item] : []));
    if (!covers(needs, items)) continue;
    const weight = items.reduce((sum, item) => sum + (weights[item] ?? 0), 0);
    if (best === null || weight < best.weight || (weight === best.weight && earlier(items, best.items)))
      best = { weight, items };
  }
  return best?.items ?? [];
}

/** The smallest item that only one of the two has belongs to the earlier one. */
function earlier(a: number[], b: number[]): boolean {
  const onlyA = a.filter((item) => !b.includes(item));
  const onlyB = b.filter((item) => !a.includes(item));
  return Math.min(...onlyA) < Math.min(...onlyB);
}

describe('choosing items to cover needs', () => {
  test('agrees with brute force', () => {
    fc.assert(
      fc.property(cases(9, 12), (given) => {
        expect(coverNeeds(given.needs, given.weights)).toEqual({ chosen: bruteForce(given), proven: true });
      }),
      { numRuns: 3000 },
    );
  });

  test('out of steps it still covers every need, without an idle item, and says that it is not proven', () => {
    fc.assert(
      fc.property(cases(40, 40), ({ needs, weights }) => {
        const { chosen } = coverNeeds(needs, weights, 0);
        expect(covers(needs, chosen)).toBe(true);
        for (const item of chosen)
          expect(
            covers(
              needs,
              chosen.filter((other) => other !== item),
            ),
          ).toBe(false);
      }),
    );
    const ring = Array.from({ length: 9 }, (_, at) => [at, (at + 1) % 9]);
    expect(coverNeeds(ring, Array(9).fill(1), 0).proven).toBe(false);
    expect(coverNeeds(ring, Array(9).fill(1))).toMatchObject({ proven: true, chosen: { length: 5 } });
  });

  test('sixty harps and sixty needs of three are still proven', () => {
    fc.assert(
      fc.property(
        fc.array(fc.uniqueArray(fc.nat(59), { minLength: 3, maxLength: 3 }), {
          minLength: 60,
          maxLength: 60,
        }),
        (needs) => coverNeeds(needs, Array(60).fill(1)).proven,
      ),
      { numRuns: 40 },
    );
  });

  test('a need that nothing can cover is a bug of the caller', () => {
    expect(() => coverNeeds([[]], [1])).toThrow(RangeError);
  });
});
