import type { Route } from 'next';
import Link from 'next/link';
import { type FormEvent, useEffect, useState } from 'react';
import { CONTROL } from '@/components/forms/field-frame';
import { Button } from '@/components/ui/button';
import { ARRIVAL_STATES, ARRIVAL_WORDS } from '@/lib/domain/door/arrival-states';
import { ALL_PEOPLE, DUE_FILTERS, DUE_WORDS, type PeopleQuery } from '@/lib/domain/people/people-query';
import { REGISTRATION_STATES, STATE_WORDS } from '@/lib/domain/registration/states';
import { FilterSelect } from './filter-select';
import type { ChangeQuery } from './use-people-query';

type PeopleFiltersProps = {
  campId: string;
  query: PeopleQuery;
  change: ChangeQuery;
  tracks: readonly { id: string; name: string }[];
};
const TYPING_PAUSE = 120;

/** A GET form, so that it works without JavaScript; with it, every choice and pause in typing shows at once. */
export function PeopleFilters({ campId, query, change, tracks }: PeopleFiltersProps) {
  const [typed, setTyped] = useState(query.q);
  useEffect(() => {
    const wait = setTimeout(() => change({ q: typed.trim() }), TYPING_PAUSE);
    return () => clearTimeout(wait);
  }, [typed, change]);
  const path = `/organise/camps/${campId}/people`;
  const filtered = (['q', 'state', 'track', 'arrival', 'due'] as const).some((name) => query[name] !== '');
  const showAll = () => {
    setTyped('');
    change({ q: '', state: '', track: '', arrival: '', due: '' });
  };
  return (
    <search>
      <form
        method="get"
        action={path}
        onSubmit={(event: FormEvent) => {
          event.preventDefault();
          change({ q: typed.trim() });
        }}
        className="no-print mb-4 grid grid-cols-2 items-end gap-x-4 gap-y-3 md:grid-cols-[2fr_1fr_1fr_1fr_1fr_auto]"
      >
        {query.sort !== ALL_PEOPLE.sort && <input type="hidden" name="sort" value={query.sort} />}
        {query.dir !== ALL_PEOPLE.dir && <input type="hidden" name="dir" value={query.dir} />}
        <label className="col-span-2 min-w-0 md:col-span-1">
          <span className="block text-small font-semibold">Name, e-mail or order</span>
          <input
            type="search"
            name="q"
            maxLength={100}
            value={typed}
            onChange={(event) => setTyped(event.target.value)}
            autoComplete="off"
            spellCheck={false}
            className={CONTROL}
          />
        </label>
        <FilterSelect
          name="state"
          label="State"
          value={query.state}
          onPick={(state) => change({ state: state as PeopleQuery['state'] })}
          choices={REGISTRATION_STATES.map((value) => ({ value, label: STATE_WORDS[value] }))}
        />
        <FilterSelect
          name="track"
          label="Track"
          value={query.track}
          onPick={(track) => change({ track })}
          choices={tracks.map(({ id, name }) => ({ value: id, label: name }))}
        />
        <FilterSelect
          name="arrival"
          label="Arrival"
          value={query.arrival}
          onPick={(arrival) => change({ arrival: arrival as PeopleQuery['arrival'] })}
          choices={ARRIVAL_STATES.map((value) => ({ value, label: ARRIVAL_WORDS[value] }))}
        />
        <FilterSelect
          name="due"
          label="Due"
          value={query.due}
          onPick={(due) => change({ due: due as PeopleQuery['due'] })}
          choices={DUE_FILTERS.map((value) => ({ value, label: DUE_WORDS[value] }))}
        />
        <div className="col-span-2 flex flex-wrap items-center gap-4 md:col-span-1">
          <Button type="submit">Find</Button>
          {filtered && (
            <Link
              href={path as Route}
              onClick={(event) => {
                event.preventDefault();
                showAll();
              }}
              className="inline-flex min-h-target items-center"
            >
              Show everyone
            </Link>
          )}
        </div>
      </form>
    </search>
  );
}
