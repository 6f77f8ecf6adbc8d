import type { ReactNode } from 'react';
import type { Harp } from '@/lib/domain/harp/harp';
import { harpLabel } from '@/lib/domain/harp/harp-label';
import { holeOneMidi } from '@/lib/domain/harp/hole-one';
import { HarpName } from './harp-name';

/** From Low D (50), all pine, to High F# or so: the standard keys (55 to 66) spread over most of the run. */
const tint = (harp: Harp): number => Math.min(1, Math.max(0, (holeOneMidi(harp) - 52) / 14));

/** One harp, its key in words; the hole beside it runs from pine (low) to brass (high) as an extra. */
export function HarpChip({ harp, children }: { harp: Harp; children?: ReactNode }) {
  return (
    <span className="inline-flex min-h-8 items-center gap-2 whitespace-nowrap rounded border border-edge bg-panel py-0.5 pl-1.5 pr-2.5 font-semibold text-ink print:min-h-0 print:gap-1 print:py-0 print:pr-2">
      <svg viewBox="0 0 16 16" className="size-4 shrink-0" aria-hidden="true">
        <rect x="1" y="1" width="14" height="14" className="fill-pine" />
        <rect x="1" y="1" width="14" height="14" className="fill-brass" fillOpacity={tint(harp)} />
        <rect x="1" y="1" width="14" height="14" className="fill-none stroke-edge" strokeWidth="1.5" />
      </svg>
      <span>
        <HarpName>{harpLabel(harp)}</HarpName>
      </span>
      {children}
    </span>
  );
}
