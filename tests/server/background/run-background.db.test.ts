import { expect, test } from 'vitest';
import { holdLease, releaseLease } from '@/lib/server/background/hold-lease';
import { runDueJobs } from '@/lib/server/background/run-background';
import { useTestDatabase } from '@/tests/setup/test-database';

useTestDatabase();

test('one process holds the lease until it lapses or is given back', () => {
  expect(holdLease('x', 'a', 1_000)).toBe(true);
  expect(holdLease('x', 'b', 2_000)).toBe(false);
  expect(holdLease('x', 'a', 15_000)).toBe(true);
  expect(holdLease('x', 'b', 16_001)).toBe(false);
  expect(holdLease('x', 'b', 30_001)).toBe(true);
  expect(holdLease('x', 'a', 30_002)).toBe(false);
  releaseLease('x', 'a');
  expect(holdLease('x', 'a', 30_003)).toBe(false);
  releaseLease('x', 'b');
  expect(holdLease('x', 'a', 30_004)).toBe(true);
});

test('a job that breaks does not hold up the others, and each waits its turn', async () => {
  const ran: string[] = [];
  const due = new Map<string, number>();
  let clock = 0;
  const jobs = [
    {
      name: 'breaks',
      everyMs: 10,
      run: () => {
        ran.push('breaks');
        throw new Error('no');
      },
    },
    { name: 'works', everyMs: 50, run: () => ran.push('works') },
  ];
  await runDueJobs(jobs, due, () => clock);
  clock = 20;
  await runDueJobs(jobs, due, () => clock);
  clock = 60;
  await runDueJobs(jobs, due, () => clock);
  expect(ran).toEqual(['breaks', 'works', 'breaks', 'breaks', 'works']);
});
