import { expect, test } from 'vitest';
import { countStatements, READERS } from '../../setup/count-statements';
import { useTestDatabase } from '../../setup/test-database';

const at = useTestDatabase();
const found: Record<string, number>[] = [];
test.each([
  [10, 8],
  [10_000, 200],
])('no reader takes more statements than it says, at %i people and %i workshops', (people, workshops) => {
  const counted = countStatements(at.db, people, workshops);
  for (const [name, [most]] of Object.entries(READERS)) {
    expect.soft(counted[name], name).toBeGreaterThan(0);
    expect.soft(counted[name], name).toBeLessThanOrEqual(most);
  }
  found.push(counted);
});

test('ten thousand people and two hundred workshops take exactly as many statements as ten and eight', () => {
  expect(found).toHaveLength(2);
  expect(found[1]).toEqual(found[0]);
});
