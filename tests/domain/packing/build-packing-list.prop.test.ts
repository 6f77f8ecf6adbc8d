import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Harp } from '@/lib/domain/harp/harp';
import type { HarpAsk, HarpNeed } from '@/lib/domain/harp/harp-ask';
import { harpFromAsk } from '@/lib/domain/harp/harp-from-ask';
import { type HarpId, harpId, parseHarpId } from '@/lib/domain/harp/harp-id';
import type { PitchClass } from '@/lib/domain/harp/pitch-class';
import type { Position } from '@/lib/domain/harp/position';
import { buildPackingList, type PackingInput } from '@/lib/domain/packing/build-packing-list';
import type { PackingMeeting } from '@/lib/domain/packing/packing-meeting';
import { preferHarps } from '@/lib/domain/packing/prefer-harps';

/** Few keys, so that choices overlap and interesting covers come up often. */
const key = fc.constantFrom<PitchClass>('C', 'D', 'F#', 'G', 'A');
const harp: fc.Arbitrary<Harp> = fc.record({
  root: key,
  tuning: fc.constantFrom('richter', 'richter', 'natural-minor'),
  register: fc.constantFrom('standard', 'standard', 'low'),
});
const ask: fc.Arbitrary<HarpAsk> = fc.oneof(
  fc.record({
    by: fc.constant('harp' as const),
    labelKey: key,
    tuning: fc.constantFrom('richter' as const, 'natural-minor' as const),
    register: fc.constantFrom('standard' as const, 'low' as const),
  }),
  fc.record({
    by: fc.constant('song' as const),
    songKey: fc.record({ tonic: key, minor: fc.boolean() }),
    position: fc.constantFrom<Position>(1, 2, 3),
    tuning: fc.constant('richter' as const),
    register: fc.constant('standard' as const),
  }),
);
const need: fc.Arbitrary<HarpNeed> = fc.record({
  level: fc.constantFrom('required', 'required', 'helpful'),
  anyOf: fc.array(ask, { maxLength: 3 }),
});
const camp: fc.Arbitrary<PackingInput> = fc.record({
  meetings: fc
    .array(
      fc.record({
        workshop: fc.constantFrom('Bends', 'Band lab', 'Jam'),
        day: fc.constantFrom('2026-07-13', '2026-07-14'),
        starts: fc.constantFrom('09:00', '11:00', '14:00'),
        ends: fc.constant('15:00'),
        room: fc.constantFrom('Hall', 'Loft'),
        needs: fc.array(need, { maxLength: 3 }),
      }),
      { maxLength: 6 },
    )
    .map((meetings): PackingMeeting[] => meetings.map((meeting, at) => ({ ...meeting, id: `mtg_${at}` }))),
  owned: fc.array(harp, { maxLength: 4 }),
  loaners: fc.array(harp, { maxLength: 2 }),
});

const required = ({ meetings }: PackingInput): Set<HarpId>[] =>
  meetings
    .flatMap(({ needs }) => needs)
    .filter(({ level, anyOf }) => level === 'required' && anyOf.length > 0)
    .map(({ anyOf }) => new Set(anyOf.map((each) => harpId(harpFromAsk(each)))));

const covers = (needs: Set<HarpId>[], chosen: readonly HarpId[]): boolean =>
  needs.every((options) => chosen.some((id) => options.has(id)));

/** [to bring, loaners, own]: smaller is better, first entry first. */
function cost({ owned, loaners = [] }: PackingInput, chosen: readonly HarpId[]): [number, number, number] {
  const own = new Set(owned.map(harpId));
  const lent = new Set(loaners.map(harpId));
  const mine = chosen.filter((id) => own.has(id)).length;
  const loans = chosen.filter((id) => !own.has(id) && lent.has(id)).length;
  return [chosen.length - mine - loans, loans, mine];
}

const compare = (a: readonly number[], b: readonly number[]): number =>
  a.reduce((order, value, at) => order || value - (b[at] ?? 0), 0);

/** Every set of harps tried; ties by the place of the harps in order of preference. */
function bruteForce(input: PackingInput): HarpId[] {
  const needs = required(input);
  const all = [...new Set(needs.flatMap((options) => [...options]))]
    .flatMap((id) => parseHarpId(id) ?? [])
    .sort(preferHarps)
    .map(harpId);
  let best: { ids: HarpId[]; cost: number[]; places: number[] } | null = null;
  for (let mask = 0; mask < 1 << all.length; mask += 1) {
    const places = all.flatMap((_, at) => (mask & (1 << at) ? [at] : []));
    const ids = places.flatMap((at) => all[at] ?? []);
    if (!covers(needs, ids)) continue;
    const found = { ids, cost: cost(input, ids), places };
    const order = best ? compare(found.cost, best.cost) || compare(places, best.places) : -1;
    if (order < 0) best = found;
  }
  return best?.ids ?? [];
}

const requiredIds = (input: PackingInput): HarpId[] =>
  buildPackingList(input)
    .lines.filter(({ level }) => level === 'required')
    .map(({ id }) => id);

describe('packing lists of random camps', () => {
  test('ten thousand agree with brute force', () => {
    fc.assert(
      fc.property(
        camp.filter((input) => new Set(required(input).flatMap((options) => [...options])).size <= 8),
        (input) => {
          expect(new Set(requiredIds(input))).toEqual(new Set(bruteForce(input)));
        },
      ),
      { numRuns: 10_000 },
    );
  }, 120_000);

  test('every need is met and no required harp could be left out', () => {
    fc.assert(
      fc.property(camp, (input) => {
        const chosen = requiredIds(input);
        const needs = required(input);
        expect(covers(needs, chosen)).toBe(true);
        for (const id of chosen)
          expect(
            covers(
              needs,
              chosen.filter((other) => other !== id),
            ),
          ).toBe(false);
        const { lines } = buildPackingList(input);
        const all = lines.map(({ id }) => id);
        const helpful = input.meetings
          .flatMap((meeting) => meeting.needs)
          .filter(({ anyOf }) => anyOf.length > 0)
          .map(({ anyOf }) => new Set(anyOf.map((each) => harpId(harpFromAsk(each)))));
        expect(covers(helpful, all)).toBe(true);
        for (const line of lines) expect(line.uses.length).toBeGreaterThan(0);
      }),
      { numRuns: 1000 },
    );
  });

  test('helpful needs never change the required harps', () => {
    fc.assert(
      fc.property(camp, (input) => {
        const without = input.meetings.map((meeting) => ({
          ...meeting,
          needs: meeting.needs.filter(({ level }) => level === 'required'),
        }));
        expect(requiredIds(input)).toEqual(requiredIds({ ...input, meetings: without }));
      }),
      { numRuns: 500 },
    );
  });

  test('the order of meetings, needs, alternatives and harps owned is irrelevant', () => {
    const shuffled = <T>(list: readonly T[]): fc.Arbitrary<T[]> =>
      fc.shuffledSubarray([...list], { minLength: list.length });
    const pair = camp.chain((input) =>
      fc.tuple(
        fc.constant(input),
        fc.record({
          meetings: fc
            .tuple(
              ...input.meetings.map((meeting) =>
                fc
                  .tuple(
                    ...meeting.needs.map((each) => shuffled(each.anyOf).map((anyOf) => ({ ...each, anyOf }))),
                  )
                  .chain((needs) => shuffled(needs))
                  .map((needs) => ({ ...meeting, needs })),
              ),
            )
            .chain((meetings) => shuffled(meetings)),
          owned: shuffled(input.owned),
          loaners: shuffled(input.loaners ?? []),
        }),
      ),
    );
    fc.assert(
      fc.property(pair, ([input, other]) => {
        expect(buildPackingList(other)).toEqual(buildPackingList(input));
      }),
      { numRuns: 1000 },
    );
  });

  test('the days tell the same as the lines', () => {
    fc.assert(
      fc.property(camp, (input) => {
        const { lines, days } = buildPackingList(input);
        const fromLines = lines.flatMap(({ id, uses }) =>
          uses.map((use) => `${use.day} ${use.meetingId} ${id} ${use.level} ${use.sentence}`),
        );
        const fromDays = days.flatMap(({ day, stops }) =>
          stops.flatMap(({ meetingId, carry }) =>
            carry.map((item) => `${day} ${meetingId} ${item.id} ${item.level} ${item.sentence}`),
          ),
        );
        expect(fromDays.sort()).toEqual(fromLines.sort());
      }),
      { numRuns: 500 },
    );
  });
});
