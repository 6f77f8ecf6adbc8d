import type { ReactNode } from 'react';
import { formatMoney } from '@/lib/domain/shared/money';
import { sayDays } from '@/lib/domain/shared/say-date';
import type { ProgrammeCamp } from '@/lib/domain/timetable/programme';

type CampPosterProps = {
  camp: ProgrammeCamp;
  price: { price: Parameters<typeof formatMoney>[0]; varies: boolean } | null;
  /** Places, and the one thing to do. */
  children: ReactNode;
};

/** The name as large as it will go, and the facts one asks first. */
export function CampPoster({ camp, price, children }: CampPosterProps) {
  return (
    <header className="oxford pt-5">
      <p className="text-lead text-soft">{camp.organisationName} invites you to</p>
      <h1 className="mt-1 break-words text-poster text-pine">{camp.name}</h1>
      {camp.summary && <p className="mt-5 max-w-prose text-lead">{camp.summary}</p>}
      <div className="mt-8 grid gap-x-10 gap-y-8 border-t border-edge pt-5 lg:grid-cols-[minmax(0,1fr)_18rem]">
        <dl className="grid gap-x-8 gap-y-5 sm:grid-cols-3">
          <Fact name="When" fact={sayDays(camp.startsOn, camp.endsOn)}>
            Door opens {camp.arrivalFrom} on the first day. All times are {camp.timeZone} time.
          </Fact>
          <Fact name="Where" fact={camp.venueName || 'To be told'}>
            {camp.venueAddress}
          </Fact>
          <Fact
            name={price?.varies ? 'Price from' : 'Price'}
            fact={price ? formatMoney(price.price, camp.currency) : 'To be told'}
          >
            {price && `For one place, in ${camp.currency}.`}
            {price?.varies && ' It differs by track.'}
          </Fact>
        </dl>
        <div>{children}</div>
      </div>
    </header>
  );
}

function Fact({ name, fact, children }: { name: string; fact: string; children?: ReactNode }) {
  return (
    <div className="min-w-0">
      <dt className="text-small text-soft">{name}</dt>
      <dd>
        <strong className="block break-words font-head text-h3 font-bold leading-tight">{fact}</strong>
        {children && <span className="mt-1 block break-words text-small text-soft">{children}</span>}
      </dd>
    </div>
  );
}
