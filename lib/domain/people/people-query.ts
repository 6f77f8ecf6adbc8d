import type { ArrivalState } from '../door/arrival-states';
import type { RegistrationState } from '../registration/states';

export const PEOPLE_SORTS = ['name', 'track', 'state', 'arrival', 'due', 'order', 'registered'] as const;
export type PeopleSort = (typeof PEOPLE_SORTS)[number];
export const DUE_FILTERS = ['owes', 'even', 'back'] as const;
/** owes: something is still to pay · even: nothing · back: we owe the payer. */
export type DueFilter = (typeof DUE_FILTERS)[number];

export const DUE_WORDS = {
  owes: 'Something to pay',
  even: 'Nothing due',
  back: 'Money to give back',
} satisfies Record<DueFilter, string>;

/** What a people table shows: search, filters (empty is all), order and page. The same in the address and the API. */
export type PeopleQuery = {
  q: string;
  state: RegistrationState | '';
  track: string;
  arrival: ArrivalState | '';
  due: DueFilter | '';
  sort: PeopleSort;
  dir: 'asc' | 'desc';
  /** From 1. */
  page: number;
};

export const PEOPLE_PAGE_SIZE = 50;
export const ALL_PEOPLE: PeopleQuery = {
  q: '',
  state: '',
  track: '',
  arrival: '',
  due: '',
  sort: 'name',
  dir: 'asc',
  page: 1,
};

/** The query as an address says it, without what is usual: "" or "?q=mei&state=held". */
export function peopleSearch(query: PeopleQuery): string {
  const search = new URLSearchParams();
  for (const name of Object.keys(ALL_PEOPLE) as (keyof PeopleQuery)[])
    if (query[name] !== ALL_PEOPLE[name]) search.set(name, String(query[name]));
  const text = search.toString();
  return text && `?${text}`;
}
