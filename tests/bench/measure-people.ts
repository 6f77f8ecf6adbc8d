import { PEOPLE } from './fill-bench';
import { interleave, median } from './interleave';
import type { Row } from './report';
import { LARGE_CAMP, type Stage } from './stage';

const TYPED = ['m', 'me', 'mei', 'mei w', 'mei wó', 'mei wójcik', 'payer00', 'nobody'];

/** One keystroke in the filter of the people table: the route's whole answer, read to its end. */
export async function measurePeople({ app, bare, cookie, registrationId }: Stage): Promise<Row[]> {
  const route = `${app}/api/organise/camps/${LARGE_CAMP}/people`;
  const ask = async (url: string) => {
    const start = performance.now();
    const answer = await fetch(url, { headers: { cookie } });
    const text = await answer.text();
    if (!answer.ok) throw new Error(`${url} answered ${answer.status}: ${text.slice(0, 200)}`);
    return { ms: performance.now() - start, text };
  };
  const whole = JSON.parse((await ask(route)).text);
  if (whole.total !== PEOPLE) throw new Error(`The people route found ${whole.total} people`);
  const slowest: number[] = [];
  const each = async (urls: string[]) => {
    const took: number[] = [];
    for (const url of urls) took.push((await ask(url)).ms);
    return took;
  };
  const speed = await interleave({
    keystroke: async () => {
      const took = await each(TYPED.map((text) => `${route}?q=${encodeURIComponent(text)}`));
      slowest.push(Math.max(...took));
      return median(took);
    },
    sorted: async () =>
      median(await each(['due', 'track', 'registered'].map((by) => `${route}?sort=${by}&dir=desc`))),
    bare: async () => median(await each(TYPED.map(() => `${bare}/echo`))),
    packing: async () =>
      median(await each(TYPED.map(() => `${app}/my/registrations/${registrationId}/packing-list`))),
  });
  const held = { unit: 'ms', better: 'down', floor: 100, reach: 50 } as const;
  return [
    {
      ...held,
      what: `people route, a filter keystroke at ${PEOPLE} rows`,
      value: speed.keystroke,
      figures: `slowest of a round ${median(slowest.slice(1)).toFixed(1)} ms; a bare handler ${speed.bare.toFixed(1)} ms; the route's answer only, not the table's drawing`,
    },
    {
      ...held,
      what: `people route, a new order at ${PEOPLE} rows`,
      value: speed.sorted,
      figures: 'by what is due, by track, by day of registering',
    },
    {
      ...held,
      floor: null,
      reach: null,
      what: 'packing list page of one player, whole answer',
      value: speed.packing,
      figures: '60 workshops, camp of 10,000',
    },
  ];
}
