import { compareHarps } from '@/lib/domain/harp/compare-harps';
import type { Harp } from '@/lib/domain/harp/harp';
import { harpId } from '@/lib/domain/harp/harp-id';
import { HarpChip } from './harp-chip';

type HarpRowProps = {
  harps: readonly Harp[];
  /** What the list is of, for those who hear it: "Harps for the Blue track". */
  label: string;
};

/** A set of harps, each once, in pitch order, low on the left. Nothing when there is none: the page says what that means. */
export function HarpRow({ harps, label }: HarpRowProps) {
  const each = [...new Map(harps.map((harp) => [harpId(harp), harp])).entries()];
  if (each.length === 0) return null;
  return (
    <ul aria-label={label} className="flex flex-wrap gap-2">
      {each
        .sort(([, a], [, b]) => compareHarps(a, b))
        .map(([id, harp]) => (
          <li key={id}>
            <HarpChip harp={harp} />
          </li>
        ))}
    </ul>
  );
}
