'use client';

import { keepPreviousData, QueryClient, QueryClientProvider, useQuery } from '@tanstack/react-query';
import { useDeferredValue, useState } from 'react';
import { ARRIVAL_WORDS, type ArrivalState } from '@/lib/domain/door/arrival-states';
import { type RegistrationState, STATE_WORDS } from '@/lib/domain/registration/states';
import type { RegistrationId } from '@/lib/domain/shared/ids';
import { CONTROL } from '../forms/field-frame';

type Hit = {
  registrationId: RegistrationId;
  name: string;
  track: string;
  state: RegistrationState;
  arrival: ArrivalState;
};

type NameSearchProps = { campId: string; onPick: (id: RegistrationId) => void };

const client = new QueryClient({ defaultOptions: { queries: { retry: 1, staleTime: 0, gcTime: 30_000 } } });

/** Three letters of a name: the lost ticket's way in. */
export function NameSearch(props: NameSearchProps) {
  return (
    <QueryClientProvider client={client}>
      <Search {...props} />
    </QueryClientProvider>
  );
}

function Search({ campId, onPick }: NameSearchProps) {
  const [letters, setLetters] = useState('');
  const asked = useDeferredValue(letters.trim());
  const { data, isError, isFetching } = useQuery({
    queryKey: ['door-people', campId, asked],
    enabled: asked.length > 0,
    placeholderData: keepPreviousData,
    queryFn: async ({ signal }): Promise<Hit[]> => {
      const response = await fetch(`/api/door/${campId}/people?q=${encodeURIComponent(asked)}`, { signal });
      if (!response.ok) throw new Error(String(response.status));
      return ((await response.json()) as { people: Hit[] }).people;
    },
  });
  const hits = asked === '' ? [] : (data ?? []);

  return (
    <section aria-labelledby="by-name">
      <h2 id="by-name" className="mb-2 text-h3">
        By name
      </h2>
      <label htmlFor="door-name" className="block font-semibold">
        A few letters of the name
      </label>
      <input
        id="door-name"
        type="search"
        autoComplete="off"
        spellCheck={false}
        value={letters}
        onChange={(event) => setLetters(event.target.value)}
        className={CONTROL}
      />
      <p role="status" className="mt-1 min-h-6 text-small text-soft">
        {isError && 'No answer from the server. Try again when there is signal.'}
        {!isError &&
          asked !== '' &&
          !isFetching &&
          (hits.length === 0 ? `Nobody with “${asked}”.` : `${hits.length} found`)}
      </p>
      <ul className="divide-y divide-line border-y border-line empty:border-0">
        {hits.map((hit) => (
          <li key={hit.registrationId}>
            <button
              type="button"
              onClick={() => {
                setLetters('');
                onPick(hit.registrationId);
              }}
              className="flex min-h-16 w-full flex-wrap items-center justify-between gap-x-4 px-2 py-2 text-left hover:bg-panel"
            >
              <span className="min-w-0">
                <span className="block break-words text-lead font-semibold">{hit.name}</span>
                <span className="text-small text-soft">{hit.track}</span>
              </span>
              <span className="font-semibold">
                {hit.state === 'confirmed' ? ARRIVAL_WORDS[hit.arrival] : STATE_WORDS[hit.state]}
              </span>
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}
