import type { Route } from 'next';
import Link from 'next/link';
import { buttonClass } from '@/components/ui/button';
import { PEOPLE_PAGE_SIZE, type PeopleQuery, peopleSearch } from '@/lib/domain/people/people-query';
import type { PeoplePage } from '@/lib/domain/people/people-row';
import type { ChangeQuery } from './use-people-query';

type PeoplePagerProps = {
  campId: string;
  page: PeoplePage;
  query: PeopleQuery;
  change: ChangeQuery;
  mayExport: boolean;
};

export function PeoplePager({ campId, page, query, change, mayExport }: PeoplePagerProps) {
  const from = (page.page - 1) * PEOPLE_PAGE_SIZE;
  const step = (to: number, word: string) => (
    <Link
      href={`/organise/camps/${campId}/people${peopleSearch({ ...query, page: to })}` as Route}
      prefetch={false}
      onClick={(event) => {
        event.preventDefault();
        change({ page: to });
      }}
      className="inline-flex min-h-target items-center font-semibold"
    >
      {word}
    </Link>
  );
  return (
    <div className="mt-4 flex flex-wrap items-center gap-x-6 gap-y-2">
      <p role="status">
        {page.total <= PEOPLE_PAGE_SIZE ? (
          <>
            <span className="figures">{page.total}</span> {page.total === 1 ? 'person' : 'people'}
          </>
        ) : (
          <>
            <span className="figures">
              {from + 1}–{from + page.rows.length}
            </span>{' '}
            of <span className="figures">{page.total.toLocaleString('en-GB')}</span> people
          </>
        )}
      </p>
      {page.pages > 1 && (
        <nav aria-label="Pages" className="flex gap-5">
          {page.page > 1 && step(page.page - 1, 'Previous page')}
          {page.page < page.pages && step(page.page + 1, 'Next page')}
        </nav>
      )}
      {mayExport && page.total > 0 && (
        <a
          href={`/api/organise/camps/${campId}/people.csv${peopleSearch({ ...query, page: 1 })}`}
          download
          className={buttonClass('plain', 'ml-auto')}
        >
          Save this list as CSV
        </a>
      )}
    </div>
  );
}
