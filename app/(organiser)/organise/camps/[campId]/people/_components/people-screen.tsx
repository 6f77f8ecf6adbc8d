'use client';

import { keepPreviousData, QueryClient, QueryClientProvider, useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Empty } from '@/components/ui/empty';
import { Notice } from '@/components/ui/notice';
import { ALL_PEOPLE, type PeopleQuery } from '@/lib/domain/people/people-query';
import type { PeoplePage } from '@/lib/domain/people/people-row';
import { fetchPeople } from './fetch-people';
import { PeopleFilters } from './people-filters';
import { PeoplePager } from './people-pager';
import { PeopleTable } from './people-table';
import { PersonSheet } from './person-sheet';
import { usePeopleQuery } from './use-people-query';

export type PeopleScreenProps = {
  campId: string;
  timeZone: string;
  tracks: readonly { id: string; name: string }[];
  /** What the address asked for when the page was made, and its first page of rows. */
  query: PeopleQuery;
  first: PeoplePage;
  mayExport: boolean;
  mayReadNeeds: boolean;
};

export function PeopleScreen(props: PeopleScreenProps) {
  const [client] = useState(
    () => new QueryClient({ defaultOptions: { queries: { retry: 1, staleTime: 10_000 } } }),
  );
  return (
    <QueryClientProvider client={client}>
      <Screen {...props} />
    </QueryClientProvider>
  );
}

function Screen({ campId, query: asked, first, ...props }: PeopleScreenProps) {
  const [query, change] = usePeopleQuery(asked);
  const [open, setOpen] = useState<string | null>(null);
  const { data, isError, isFetching, refetch } = useQuery({
    queryKey: ['people', campId, query],
    queryFn: ({ signal }) => fetchPeople(campId, query, signal),
    placeholderData: keepPreviousData,
    // The rows that came with the page answer the question that the page was asked, and no other.
    initialData: query === asked ? first : undefined,
    initialDataUpdatedAt: Date.now,
  });
  const page = data ?? first;
  return (
    <>
      <PeopleFilters campId={campId} query={query} change={change} tracks={props.tracks} />
      {isError && (
        <Notice tone="stop" title="The list does not answer just now" live>
          <p>What you see may be out of date. Nothing was lost.</p>
          <button
            type="button"
            className="min-h-target font-semibold text-lake underline"
            onClick={() => refetch()}
          >
            Try again
          </button>
        </Notice>
      )}
      {page.total === 0 ? (
        <NobodyFound query={query} />
      ) : (
        <PeopleTable
          campId={campId}
          page={page}
          query={query}
          change={change}
          onOpen={setOpen}
          busy={isFetching}
          {...props}
        />
      )}
      <PeoplePager campId={campId} page={page} query={query} change={change} mayExport={props.mayExport} />
      <PersonSheet
        campId={campId}
        timeZone={props.timeZone}
        registrationId={open}
        mayReadNeeds={props.mayReadNeeds}
        onClose={() => setOpen(null)}
      />
    </>
  );
}

function NobodyFound({ query }: { query: PeopleQuery }) {
  const all = Object.entries(ALL_PEOPLE).every(
    ([name, value]) => ['sort', 'dir', 'page'].includes(name) || query[name as keyof PeopleQuery] === value,
  );
  return all ? (
    <Empty title="Nobody has registered yet">People appear here as soon as they hold a place.</Empty>
  ) : (
    <Empty title="Nobody matches this">Search for less, or show everyone again.</Empty>
  );
}
