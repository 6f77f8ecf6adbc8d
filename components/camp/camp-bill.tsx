import type { Route } from 'next';
import Link from 'next/link';
import type { CampStanding } from '@/lib/domain/camp/camp-standing';
import { LEVEL_WORDS, type TrackLevel } from '@/lib/domain/camp/camp-words';
import { formatMoney, type Minor } from '@/lib/domain/shared/money';
import { sayDays } from '@/lib/domain/shared/say-date';
import { type MarkTone, StateMark } from '../ui/state-mark';
import { PlacesLeft } from './places-left';

type CampBillProps = {
  camp: {
    slug: string;
    name: string;
    summary: string;
    startsOn: string;
    endsOn: string;
    venueName: string;
    currency: string;
    price: { price: Minor; varies: boolean } | null;
    tracks: readonly { name: string; level: TrackLevel }[];
    places: { left: number; capacity: number };
    standing: CampStanding;
  };
};

/** One camp on the board: when, its name as large as it will go, what is left. */
export function CampBill({ camp }: CampBillProps) {
  const { standing, price, places } = camp;
  return (
    <li className="oxford grid gap-x-10 gap-y-5 pb-12 pt-6 lg:grid-cols-[minmax(0,1fr)_17rem]">
      <div className="min-w-0">
        <p className="text-lead font-semibold">
          {sayDays(camp.startsOn, camp.endsOn)}
          {camp.venueName && <span className="font-normal text-soft"> · {camp.venueName}</span>}
        </p>
        <h2 className="mt-2 break-words text-bill">
          <Link
            href={`/camps/${camp.slug}` as Route}
            className="text-pine underline decoration-1 underline-offset-8 hover:decoration-[3px]"
          >
            {camp.name}
          </Link>
        </h2>
        {camp.summary && <p className="mt-3 max-w-prose text-lead">{camp.summary}</p>}
        {camp.tracks.length > 0 && (
          <ul aria-label="Tracks" className="mt-4 flex max-w-prose flex-wrap gap-x-6 gap-y-1">
            {camp.tracks.map(({ name, level }) => (
              <li key={name}>
                {name} <span className="text-small text-soft">({LEVEL_WORDS[level]})</span>
              </li>
            ))}
          </ul>
        )}
      </div>
      <div className="space-y-4 lg:pt-1">
        {standing === 'open' || standing === 'full' ? (
          <PlacesLeft left={places.left} of={places.capacity} />
        ) : (
          <StateMark tone={STANDING[standing].tone}>{STANDING[standing].word}</StateMark>
        )}
        {price && (
          <p>
            <span className="text-small text-soft">{price.varies ? 'from ' : ''}</span>
            <strong className="font-head text-h3">{formatMoney(price.price, camp.currency)}</strong>
          </p>
        )}
      </div>
    </li>
  );
}

const STANDING = {
  closed: { tone: 'off', word: 'Registration is closed' },
  begun: { tone: 'wait', word: 'Running now' },
  past: { tone: 'off', word: 'Past' },
  draft: { tone: 'open', word: 'Draft' },
} satisfies Record<Exclude<CampStanding, 'open' | 'full'>, { tone: MarkTone; word: string }>;
