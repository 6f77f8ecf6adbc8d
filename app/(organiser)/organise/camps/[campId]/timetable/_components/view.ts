/** What the address of the timetable page says. Filters stay from one step to the next, the rest is for one step. */
export const FILTERS = ['track', 'instructor', 'in', 'on'] as const;
const STEP = ['place', 'move', 'day', 'starts', 'room', 'done'] as const;
type Filter = (typeof FILTERS)[number];
type Step = (typeof STEP)[number];
export type View = Partial<Record<Filter | Step, string>>;
export type Done = 'placed' | 'moved' | 'removed';

/** Known names only, one value each; anything else in the address is left out. */
export function readView(search: Record<string, string | string[] | undefined>): View {
  const view: View = {};
  for (const name of [...FILTERS, ...STEP]) {
    const value = search[name];
    if (typeof value === 'string' && value !== '' && value.length <= 60) view[name] = value;
  }
  return view;
}

export const filtersOf = (view: View): string =>
  new URLSearchParams(
    FILTERS.flatMap((name) => (view[name] ? [[name, view[name]] as [string, string]] : [])),
  ).toString();

/** The page's address with these filters and one step. */
export function timetableHref(campId: string, filters: string, step: View = {}): string {
  const kept = readView(Object.fromEntries(new URLSearchParams(filters)));
  const query = new URLSearchParams(filtersOf({ ...kept, ...step }));
  for (const name of STEP) if (step[name]) query.set(name, step[name]);
  const text = query.toString();
  return `/organise/camps/${encodeURIComponent(campId)}/timetable${text && `?${text}`}`;
}
