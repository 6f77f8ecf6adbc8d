import type { ReactNode } from 'react';
import type { PackingLine, PackingList as PackingListData } from '@/lib/domain/packing/packing-list';
import { PackingDays } from './packing-days';
import { PackingLines } from './packing-lines';

type PackingListProps = {
  list: PackingListData;
  /** What to do about a harp one cannot get: whom to ask, in a sentence or a link. */
  help?: ReactNode;
};

const of = (lines: readonly PackingLine[], level: PackingLine['level'], sources: PackingLine['source'][]) =>
  lines.filter((line) => line.level === level && sources.includes(line.source));

/** What to pack, split by what one has, then day by day. No heading of its own: the page says whose list it is. */
export function PackingList({ list, help }: PackingListProps) {
  const { lines, days, proven } = list;
  const named = days.some(({ stops }) => stops.some(({ carry }) => carry.length > 0));
  return (
    <div className="print:text-[11px] print:leading-snug">
      <PackingLines
        title="To get before camp"
        note="Buy or borrow these."
        lines={of(lines, 'required', ['bring'])}
      />
      <PackingLines title="Kept for you at camp" lines={of(lines, 'required', ['loaner'])} />
      <PackingLines title="Pack from your own" lines={of(lines, 'required', ['owned'])} />
      <PackingLines
        title="Helpful, not required"
        note="No workshop depends on these. Take them if you have them."
        lines={lines.filter((line) => line.level === 'helpful')}
      />
      {lines.length === 0 && (
        <p className="max-w-prose">
          {days.length > 0
            ? 'Your workshops work with a harp in any key. Bring the ones you like to play.'
            : 'None of your workshops asks for a harp so far.'}
        </p>
      )}
      {days.length > 0 && <PackingDays days={days} />}
      <div className="mt-8 max-w-prose space-y-2 text-small text-soft print:mt-3 print:max-w-none">
        {named && (
          <p>
            A position is the teacher’s word for how a song lies on the harp. You need not know it: the harp
            after the arrow is the one to take.
          </p>
        )}
        {!proven && (
          <p>
            There were too many ways to choose to compare them all. This list covers every workshop, but a
            shorter one may exist.
          </p>
        )}
        {help && lines.some(({ source }) => source === 'bring') && <p>{help}</p>}
        <p>A harp goes in the mouth: play your own, and never share one.</p>
      </div>
    </div>
  );
}
