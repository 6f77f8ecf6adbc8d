import type { Route } from 'next';
import Link from 'next/link';
import { sayShortDay } from '@/lib/domain/shared/say-date';
import { filtersOf, timetableHref, type View } from './view';

type DayTabsProps = { campId: string; days: readonly string[]; day: string; view: View };

/** On a phone the grid shows one day; these choose it. */
export function DayTabs({ campId, days, day, view }: DayTabsProps) {
  return (
    <nav aria-label="Day" className="no-print mb-3 flex flex-wrap gap-x-4 lg:hidden">
      {days.map((one) => (
        <Link
          key={one}
          scroll={false}
          href={timetableHref(campId, filtersOf({ ...view, on: one }), { ...view, done: undefined }) as Route}
          aria-current={one === day ? 'date' : undefined}
          className="inline-flex min-h-target items-center border-b-4 border-transparent px-1 font-semibold text-ink no-underline aria-[current]:border-pine"
        >
          {sayShortDay(one)}
        </Link>
      ))}
    </nav>
  );
}
