import type { Harp } from '../harp/harp';
import { type HarpId, harpId } from '../harp/harp-id';
import type { MeetingNeed } from './meeting-need';
import type { HarpSource } from './packing-list';
import { preferHarps } from './prefer-harps';

/** Gives each need to one harp of the list: one that the same meeting needs anyway, else a required, an own, a common. */
export function assignNeeds(
  needs: readonly MeetingNeed[],
  requiredHarps: readonly Harp[],
  helpfulHarps: readonly Harp[],
  sourceOf: (harp: Harp) => HarpSource,
): Map<HarpId, MeetingNeed[]> {
  const rank = { owned: 0, loaner: 1, bring: 2 } satisfies Record<HarpSource, number>;
  const ordered = (harps: readonly Harp[]): HarpId[] =>
    [...harps].sort((a, b) => rank[sourceOf(a)] - rank[sourceOf(b)] || preferHarps(a, b)).map(harpId);
  const required = ordered(requiredHarps);
  const all = [...required, ...ordered(helpfulHarps)];
  // A required need stays with the required harps, since the helpful ones may be left at home.
  const able = ({ need, optionIds }: MeetingNeed): HarpId[] =>
    (need.level === 'required' ? required : all).filter((id) => optionIds.has(id));
  const sole = new Set(
    needs.flatMap((need) => {
      const [first, second] = able(need);
      return first && !second ? `${need.meeting.id} ${first}` : [];
    }),
  );
  const served = new Map<HarpId, MeetingNeed[]>();
  for (const need of needs) {
    const ids = able(need);
    const id = ids.find((each) => sole.has(`${need.meeting.id} ${each}`)) ?? ids[0];
    if (id) served.set(id, [...(served.get(id) ?? []), need]);
  }
  return served;
}
