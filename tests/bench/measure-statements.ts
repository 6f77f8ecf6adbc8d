import { countStatements } from '../setup/count-statements';
import { PEOPLE } from './fill-bench';
import type { Row } from './report';
import { makeBase, withCopy } from './with-copy';

/** SQL statements a page or route issues with few rows and with many: exact, and a test of its own besides. */
export async function measureStatements(folder: string): Promise<Row[]> {
  const count = async (people: number, workshops: number) => {
    const base = makeBase(folder, () => {});
    return withCopy(base, (db) => countStatements(db, people, workshops));
  };
  const few = await count(10, 8);
  const many = await count(PEOPLE, 200);
  return Object.entries(few).map(([name, n]) => ({
    what: `SQL statements of ${name}, many ÷ few rows`,
    value: (many[name] ?? Number.NaN) / n,
    unit: 'ratio',
    better: 'down',
    floor: 1,
    reach: 1,
    figures: `${many[name]} at 10,000 people and 200 workshops ÷ ${n} at 10 and 8`,
  }));
}
