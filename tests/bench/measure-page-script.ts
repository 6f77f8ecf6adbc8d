import type { Row } from './report';
import { gzipTotal, scriptsOf } from './scripts-of';
import type { Stage } from './stage';

const PAGES = {
  'camp page': '/camps/kettle-lake-harp-week',
  'list of camps': '/',
  'first step of registering': '/camps/kettle-lake-harp-week/register/who',
};

/** JavaScript of public pages against the least that the same Next ships; exact, so measured once. */
export async function measurePageScript({ app, bare }: Stage): Promise<Row[]> {
  const least = gzipTotal(await scriptsOf(`${bare}/fresh`));
  return Promise.all(
    Object.entries(PAGES).map(async ([name, path]): Promise<Row> => {
      const scripts = await scriptsOf(`${app}${path}`);
      const kilo = (bytes: number) => (bytes / 1000).toFixed(1);
      return {
        what: `JavaScript of the ${name} ÷ minimal page, gzip`,
        value: gzipTotal(scripts) / least,
        unit: 'ratio',
        better: 'down',
        floor: 1.25,
        reach: 1.1,
        figures: `${kilo(gzipTotal(scripts))} kB in ${scripts.length} files ÷ ${kilo(least)} kB`,
      };
    }),
  );
}
