import { z } from 'zod';
import { ARRIVAL_STATES } from '@/lib/domain/door/arrival-states';
import { ALL_PEOPLE, DUE_FILTERS, PEOPLE_SORTS, type PeopleQuery } from '@/lib/domain/people/people-query';
import { REGISTRATION_STATES } from '@/lib/domain/registration/states';
import { isId } from '@/lib/domain/shared/ids';

const or = (words: readonly string[]) => words.join(', ');

/** A people table's query as it stands in an address; each fault names its field and what may stand there. */
export const peopleQuerySchema = z.object({
  q: z.string().trim().max(100, 'Search: at most 100 characters.').default(''),
  state: z
    .enum(['', ...REGISTRATION_STATES], `State: one of ${or(REGISTRATION_STATES)}, or empty.`)
    .default(''),
  track: z
    .string()
    .refine((text) => text === '' || isId('trk', text), 'Track: the id of a track of this camp, or empty.')
    .default(''),
  arrival: z.enum(['', ...ARRIVAL_STATES], `Arrival: one of ${or(ARRIVAL_STATES)}, or empty.`).default(''),
  due: z.enum(['', ...DUE_FILTERS], `Due: one of ${or(DUE_FILTERS)}, or empty.`).default(''),
  sort: z.enum(PEOPLE_SORTS, `Sort: one of ${or(PEOPLE_SORTS)}.`).default('name'),
  dir: z.enum(['asc', 'desc'], 'Direction: asc or desc.').default('asc'),
  page: z.coerce
    .number('Page: a whole number from 1.')
    .int()
    .min(1, 'Page: a whole number from 1.')
    .max(100_000)
    .default(1),
}) satisfies z.ZodType<PeopleQuery>;

/** For the page: what is wrong in a typed address is passed over rather than refused. */
export function readPeopleQuery(search: Record<string, string | string[] | undefined>): PeopleQuery {
  const given: Record<string, unknown> = {};
  for (const [name, value] of Object.entries(search)) given[name] = Array.isArray(value) ? value[0] : value;
  const parsed = peopleQuerySchema.safeParse(given);
  if (parsed.success) return parsed.data;
  for (const { path } of parsed.error.issues) delete given[String(path[0])];
  return peopleQuerySchema.safeParse(given).data ?? ALL_PEOPLE;
}
