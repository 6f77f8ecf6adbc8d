import type { Route } from 'next';
import Link from 'next/link';
import { sayDays } from '@/lib/domain/shared/say-date';

type PastCampsProps = {
  camps: readonly { slug: string; name: string; startsOn: string; endsOn: string; venueName: string }[];
};

/** Camps that are over, in small print; their programmes stay to look back at. */
export function PastCamps({ camps }: PastCampsProps) {
  return (
    <ul className="divide-y divide-line border-y border-line">
      {camps.map(({ slug, name, startsOn, endsOn, venueName }) => (
        <li key={slug} className="grid gap-x-8 py-3 sm:grid-cols-[15rem_minmax(0,1fr)]">
          <span className="text-soft">{sayDays(startsOn, endsOn)}</span>
          <span className="min-w-0 break-words">
            <Link href={`/camps/${slug}` as Route} className="font-semibold">
              {name}
            </Link>
            {venueName && <span className="text-soft"> · {venueName}</span>}
          </span>
        </li>
      ))}
    </ul>
  );
}
