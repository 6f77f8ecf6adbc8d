import type { Route } from 'next';
import Link from 'next/link';
import { StateMark } from '@/components/ui/state-mark';
import type { ChecklistItem } from '@/lib/domain/camp/checklist-item';
import type { CampId } from '@/lib/domain/shared/ids';

type PublishListProps = { campId: CampId; items: readonly ChecklistItem[]; mends: boolean };

/** What is missing, each with the page that mends it; what is done, in one line. */
export function PublishList({ campId, items, mends }: PublishListProps) {
  const open = items.filter(({ missing }) => missing !== null);
  const done = items.filter(({ missing }) => missing === null);
  return (
    <>
      {open.length > 0 && (
        <ul className="border-t border-line">
          {open.map(({ code, level, title, missing, mend }) => (
            <li
              key={code}
              className="grid gap-x-6 border-b border-line py-3 sm:grid-cols-[9.5rem_minmax(0,1fr)_auto] sm:items-center"
            >
              <StateMark tone={level === 'must' ? 'stop' : 'wait'}>
                {level === 'must' ? 'Must have' : 'Should have'}
              </StateMark>
              <p className="break-words">
                <span className="font-semibold">{title}.</span> {missing}
              </p>
              {mends && (
                <Link
                  href={`/organise/camps/${campId}/${mend}` as Route}
                  className="inline-flex min-h-target items-center"
                >
                  Mend<span className="sr-only"> {title.toLowerCase()}</span>
                </Link>
              )}
            </li>
          ))}
        </ul>
      )}
      {done.length > 0 && (
        <p className="mt-4 text-small text-soft">
          <StateMark tone="done">Done</StateMark> {done.map(({ title }) => title.toLowerCase()).join(', ')}.
        </p>
      )}
    </>
  );
}
