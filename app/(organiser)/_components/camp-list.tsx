import type { Route } from 'next';
import Link from 'next/link';
import { TenHoleStrip } from '@/components/harp/ten-hole-strip';
import { sayDays } from '@/lib/domain/shared/say-date';
import type { CampLine } from '@/lib/server/camps/list-camps';
import { CampStateMark } from './camp-state';

type CampListProps = {
  camps: readonly CampLine[];
  label: string;
  /** What is next for each, by id. */
  next?: ReadonlyMap<string, string>;
};

/** Camps as lines of a programme: when, what, where, what is next, and how far it has sold. */
export function CampList({ camps, label, next }: CampListProps) {
  return (
    <ul aria-label={label} className="border-t-2 border-ink">
      {camps.map((camp) => {
        const left = Math.max(0, camp.capacity - camp.taken);
        return (
          <li
            key={camp.id}
            className="grid gap-x-8 gap-y-1 border-b border-line py-4 md:grid-cols-[1fr_8rem_14rem] md:items-center"
          >
            <div className="min-w-0">
              <Link
                href={`/organise/camps/${camp.id}` as Route}
                className="inline-flex min-h-target items-center break-words font-head text-h3 font-bold"
              >
                {camp.name}
              </Link>
              <p className="text-soft">
                <span className="text-ink">{sayDays(camp.startsOn, camp.endsOn)}</span>
                {camp.venueName && ` · ${camp.venueName}`}
              </p>
              {next?.has(camp.id) && <p className="mt-1 font-semibold">{next.get(camp.id)}</p>}
            </div>
            <p>
              <CampStateMark state={camp.state} />
            </p>
            <div>
              <TenHoleStrip mode="places" left={left} of={camp.capacity} what={camp.name} />
              <p className="mt-1 text-small text-soft">
                <span className="figures text-ink">{left}</span> of{' '}
                <span className="figures">{camp.capacity}</span> places left
              </p>
            </div>
          </li>
        );
      })}
    </ul>
  );
}
