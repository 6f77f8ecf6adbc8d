import type { Route } from 'next';
import Link from 'next/link';
import { type PeopleQuery, peopleSearch } from '@/lib/domain/people/people-query';
import type { PeopleColumn } from './people-columns';
import type { ChangeQuery } from './use-people-query';

type SortHeadProps = {
  column: PeopleColumn | undefined;
  campId: string;
  query: PeopleQuery;
  change: ChangeQuery;
  className: string;
};

/** A column's head; where the server can order by it, a link that does, and turns the order the second time. */
export function SortHead({ column, campId, query, change, className }: SortHeadProps) {
  if (!column) return null;
  const here = column.sort === query.sort;
  const cell = `sticky top-0 z-10 bg-board px-1 py-1 align-bottom md:px-2 font-semibold ${column.end ? 'text-right' : ''} ${className}`;
  if (!column.sort)
    return (
      <th scope="col" className={cell}>
        <span className="inline-flex min-h-target items-center">{column.head}</span>
      </th>
    );
  const next = {
    sort: column.sort,
    dir: here && query.dir === 'asc' ? ('desc' as const) : ('asc' as const),
    page: 1,
  };
  return (
    <th
      scope="col"
      aria-sort={here ? (query.dir === 'asc' ? 'ascending' : 'descending') : undefined}
      className={cell}
    >
      <Link
        href={`/organise/camps/${campId}/people${peopleSearch({ ...query, ...next })}` as Route}
        prefetch={false}
        onClick={(event) => {
          event.preventDefault();
          change(next);
        }}
        className="inline-flex min-h-target items-center gap-1 text-ink"
      >
        {column.head}
        {here && (
          <svg viewBox="0 0 10 10" className="size-2.5" aria-hidden="true">
            <path d={query.dir === 'asc' ? 'M5 1 9 9H1z' : 'M5 9 1 1h8z'} fill="currentColor" />
          </svg>
        )}
      </Link>
    </th>
  );
}
