import { interleave } from './interleave';
import { pressGet } from './press';
import type { Row } from './report';
import { scriptsOf } from './scripts-of';
import type { Stage } from './stage';

const CAMP = '/camps/kettle-lake-harp-week';

/**
 * The camp page has no prerendered twin on the same server, because each page carries a nonce of its own. So: against
 * our page of no data and a static file of the same server; and for reading, against a bare Next's own pages.
 */
export async function measureCampPage({ app, bare }: Stage): Promise<Row[]> {
  const file = [...(await scriptsOf(`${app}${CAMP}`))].sort((a, b) => a.bytes - b.bytes)[0];
  if (!file) throw new Error('The camp page loads no script');
  const speed = await interleave({
    camp: () => pressGet(`${app}${CAMP}`),
    plain: () => pressGet(`${app}/about/accessibility`),
    file: () => pressGet(file.url),
    prerendered: () => pressGet(bare),
    bareFresh: () => pressGet(`${bare}/fresh`),
  });
  const row = (what: string, under: Exclude<keyof typeof speed, 'ratio' | 'camp'>, held: boolean): Row => ({
    what: `public camp page ÷ ${what}, requests/s`,
    value: speed.ratio('camp', under),
    unit: 'ratio',
    better: 'up',
    floor: held ? 0.5 : null,
    reach: held ? 0.9 : null,
    figures: `${Math.round(speed.camp)}/s ÷ ${Math.round(speed[under])}/s`,
  });
  return [
    row('page of no data of the same server', 'plain', true),
    row('static file of the same server', 'file', true),
    row('prerendered page of a bare Next', 'prerendered', false),
    row('rendered page of a bare Next', 'bareFresh', false),
  ];
}
