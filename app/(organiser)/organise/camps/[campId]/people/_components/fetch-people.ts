import { type PeopleQuery, peopleSearch } from '@/lib/domain/people/people-query';
import type { PeoplePage } from '@/lib/domain/people/people-row';

export async function fetchPeople(
  campId: string,
  query: PeopleQuery,
  signal: AbortSignal,
): Promise<PeoplePage> {
  const response = await fetch(`/api/organise/camps/${campId}/people${peopleSearch(query)}`, { signal });
  if (!response.ok) throw new Error(`people: ${response.status}`);
  return response.json() as Promise<PeoplePage>;
}
