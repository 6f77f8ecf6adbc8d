import { expect, test } from 'vitest';
import { spend } from '@/lib/server/rate-limit';
import { useTestDatabase } from '../../setup/test-database';

const at = useTestDatabase();

// The reads each limiter makes when it opens are not what is counted here.
const changesBy = async (run: () => Promise<unknown>): Promise<number> => {
  const total = () => at.db.$client.prepare('select total_changes()').pluck().get() as number;
  const before = total();
  await run();
  return total() - before;
};

test.each(['read', 'scan', 'edit', 'draft'] as const)('%s is counted without a write', async (budget) => {
  await spend(budget, 'somebody');
  expect(await changesBy(() => spend(budget, 'somebody'))).toBe(0);
});

test('what guards a password is counted on disk, so that a restart forgives nothing', async () => {
  await spend('sign-in-account', 'somebody');
  expect(await changesBy(() => spend('sign-in-account', 'somebody'))).toBeGreaterThan(0);
});

test.each(['read', 'sign-in-account'] as const)('%s runs out, for that client alone', async (budget) => {
  let taken = 0;
  while (taken < 100_000 && (await spend(budget, 'greedy'))) taken += 1;
  expect(taken).toBe(budget === 'read' ? 1200 : 8);
  expect(await spend(budget, 'patient')).toBe(true);
});
