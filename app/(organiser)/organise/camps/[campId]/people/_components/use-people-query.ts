import { useCallback, useEffect, useState } from 'react';
import { ALL_PEOPLE, type PeopleQuery, peopleSearch } from '@/lib/domain/people/people-query';

export type ChangeQuery = (more: Partial<PeopleQuery>) => void;

/** The query as state that the address keeps: reload, a copied link and Back find the same list. */
export function usePeopleQuery(asked: PeopleQuery): [PeopleQuery, ChangeQuery] {
  const [query, setQuery] = useState(asked);
  const change = useCallback<ChangeQuery>((more) => {
    setQuery((before) => {
      const after = { ...before, page: ALL_PEOPLE.page, ...more };
      return peopleSearch(after) === peopleSearch(before) ? before : after;
    });
  }, []);
  useEffect(() => {
    const address = window.location.pathname + peopleSearch(query);
    if (address !== window.location.pathname + window.location.search)
      window.history.replaceState(window.history.state, '', address);
  }, [query]);
  return [query, change];
}
