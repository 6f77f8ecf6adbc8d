import { compareHarps } from '../harp/compare-harps';
import type { Harp } from '../harp/harp';
import { harpId } from '../harp/harp-id';
import { harpLabel } from '../harp/harp-label';
import { assignNeeds } from './assign-needs';
import { choiceReason } from './choice-reason';
import { chooseHarps } from './choose-harps';
import { listMeetingNeeds } from './meeting-need';
import { packingDays } from './packing-days';
import type { HarpSource, PackingLine, PackingList } from './packing-list';
import type { PackingMeeting } from './packing-meeting';
import { packingUses } from './packing-uses';

export type PackingInput = {
  /** Only the attendee's own meetings. */
  meetings: readonly PackingMeeting[];
  owned: readonly Harp[];
  /** Loaners reserved for this attendee. */
  loaners?: readonly Harp[];
};

/** What to pack: the fewest harps to bring that meet every required need, one's own used first; helpful ones apart. */
export function buildPackingList({ meetings, owned, loaners = [] }: PackingInput): PackingList {
  const ownedIds = new Set(owned.map(harpId));
  const loanerIds = new Set(loaners.map(harpId));
  const sourceOf = (harp: Harp): HarpSource => {
    if (ownedIds.has(harpId(harp))) return 'owned';
    return loanerIds.has(harpId(harp)) ? 'loaner' : 'bring';
  };
  const needs = listMeetingNeeds(meetings);
  const required = chooseHarps(
    needs.filter(({ need }) => need.level === 'required').map(({ options }) => options),
    sourceOf,
  );
  const requiredIds = new Set(required.harps.map(harpId));
  const helpful = chooseHarps(
    needs
      .filter(({ optionIds }) => ![...optionIds].some((id) => requiredIds.has(id)))
      .map(({ options }) => options),
    sourceOf,
  );
  const served = assignNeeds(needs, required.harps, helpful.harps, sourceOf);
  const toLine = (harp: Harp): PackingLine => {
    const mine = served.get(harpId(harp)) ?? [];
    const source = sourceOf(harp);
    const level = requiredIds.has(harpId(harp)) ? 'required' : 'helpful';
    return {
      id: harpId(harp),
      harp,
      label: harpLabel(harp),
      source,
      level,
      uses: packingUses(harp, mine),
      why: choiceReason(
        harp,
        source,
        mine.filter(({ need }) => need.level === level),
      ),
    };
  };
  const lines = [required.harps, helpful.harps].flatMap((harps) => [...harps].sort(compareHarps).map(toLine));
  return { lines, days: packingDays(meetings, lines), proven: required.proven && helpful.proven };
}
