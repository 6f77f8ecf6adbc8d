import type { Route } from 'next';
import Link from 'next/link';
import { ARRIVAL_WORDS } from '@/lib/domain/door/arrival-states';
import type { PeopleRow } from '@/lib/domain/people/people-row';

type PersonLinkProps = { row: PeopleRow; campId: string; onOpen: (registrationId: string) => void };

/** Opens the sheet beside the list; in a new tab, or without JavaScript, the person's own page. */
export function PersonLink({ row, campId, onOpen }: PersonLinkProps) {
  return (
    <>
      <Link
        href={`/organise/camps/${campId}/people/${row.id}` as Route}
        prefetch={false}
        onClick={(event) => {
          if (event.metaKey || event.ctrlKey || event.shiftKey || event.button !== 0) return;
          event.preventDefault();
          onOpen(row.id);
        }}
        className="inline-flex min-h-target items-center wrap-anywhere font-semibold md:min-h-7"
      >
        {row.name}
      </Link>
      {row.minor && <span className="ml-2 whitespace-nowrap text-small text-soft">under age</span>}
      <span className="wrap-anywhere block text-small text-soft md:hidden">
        {row.track}, <span className="figures">{row.reference}</span>
        {row.arrival !== 'expected' && `, ${ARRIVAL_WORDS[row.arrival].toLowerCase()}`}
      </span>
    </>
  );
}
