import type { PackingDay, PackingStop } from '@/lib/domain/packing/packing-list';
import { sayDay, sayShortDay } from '@/lib/domain/shared/say-date';
import { HarpName } from './harp-name';
import { HarpRow } from './harp-row';

/** Day by day: what to put in the bag in the morning, and which of it to take to which room. */
export function PackingDays({ days }: { days: readonly PackingDay[] }) {
  return (
    <section className="mt-10 print:mt-3">
      <h2 className="border-b-2 border-ink pb-1 print:text-[14px]">Day by day</h2>
      <ol className="print:columns-2 print:gap-6">
        {days.map(({ day, carry, stops }) => (
          <li
            key={day}
            className="border-b border-line py-4 last:border-b-0 print:break-inside-avoid print:py-1.5"
          >
            <h3 className="print:text-[12px]">{sayDay(day)}</h3>
            {carry.length > 0 && (
              <div className="mt-2 print:hidden">
                <HarpRow harps={carry.map(({ harp }) => harp)} label={`Harps for ${sayShortDay(day)}`} />
              </div>
            )}
            <ol className="mt-2 print:mt-0">
              {stops.map((stop) => (
                <Stop key={stop.meetingId} day={day} stop={stop} />
              ))}
            </ol>
          </li>
        ))}
      </ol>
    </section>
  );
}

function Stop({
  day,
  stop: { workshop, starts, ends, room, carry, anyKey },
}: {
  day: string;
  stop: PackingStop;
}) {
  const labels = (level: 'required' | 'helpful'): string =>
    [...new Set(carry.filter((item) => item.level === level).map(({ label }) => label))].join(', ');
  const required = labels('required');
  const main = required || (anyKey.length > 0 ? 'Any key' : '');
  const helpful = labels('helpful');
  return (
    <li className="grid gap-x-4 py-1.5 sm:grid-cols-[8rem_1fr] print:grid-cols-[auto_1fr] print:gap-x-2 print:py-0 print:text-[10px]">
      <span className="figures whitespace-nowrap">
        <time dateTime={`${day}T${starts}`}>{starts}</time>–<time>{ends}</time>
      </span>
      <span>
        {main && (
          <strong>
            <HarpName>{main}</HarpName>
          </strong>
        )}
        {helpful && (
          <>
            {main && ', '}
            <HarpName>{helpful}</HarpName> if you have it
          </>
        )}
        <span className="block text-small text-soft print:inline print:text-[10px] print:before:content-['_·_']">
          {workshop} · {room}
          {anyKey.flatMap(({ note }) => (note ? ` · ${note}` : []))}
        </span>
      </span>
    </li>
  );
}
