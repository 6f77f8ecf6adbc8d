import { sql } from 'drizzle-orm';
import { expect, test } from 'vitest';
import { giveBack, spend } from '@/lib/server/rate-limit';
import { useTestDatabase } from '../setup/test-database';

// ASVS 5.0, 2.4.1, on a real SQLite file.
const database = useTestDatabase();
const many = async (times: number, key: string) => {
  const answers: boolean[] = [];
  for (let n = 0; n < times; n += 1) answers.push(await spend('mail-link', key));
  return answers.filter(Boolean).length;
};

test('a budget lets its number of tries through, each key for itself', async () => {
  expect(await many(9, 'a@example.test')).toBe(5);
  expect(await many(2, 'b@example.test')).toBe(2);
});

test('tries at the same moment are all counted', async () => {
  const all = await Promise.all(Array.from({ length: 20 }, () => spend('mail-link', 'c')));
  expect(all.filter(Boolean)).toHaveLength(5);
});

test('a point that is given back can be spent again', async () => {
  await many(5, 'd');
  await giveBack('mail-link', 'd');
  expect(await many(3, 'd')).toBe(1);
});

test('the window passes', async () => {
  await many(6, 'e');
  database.db.run(sql`update rate_limit set expire = ${Date.now() - 1}`);
  expect(await spend('mail-link', 'e')).toBe(true);
});

test('it outlives a restart: the count is in the file, without the address', async () => {
  await many(5, 'sam@example.test');
  const rows = database.db.all<{ key: string; points: number }>(sql`select key, points from rate_limit`);
  expect(rows).toMatchObject([{ points: 5 }]);
  expect(JSON.stringify(rows)).not.toContain('sam');
});
