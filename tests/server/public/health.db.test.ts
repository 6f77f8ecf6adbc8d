import { sql } from 'drizzle-orm';
import { expect, test } from 'vitest';
import { GET } from '@/app/api/health/route';
import { useTestDatabase } from '../../setup/test-database';

const at = useTestDatabase();

test('is ok when the database answers and every migration is in', async () => {
  const answer = GET();
  expect(answer.status).toBe(200);
  expect(await answer.json()).toEqual({ status: 'ok' });
  expect(answer.headers.get('cache-control')).toBe('no-store');
});

test('is 503 and says so when a migration is missing', async () => {
  at.db.run(
    sql`delete from __drizzle_migrations where rowid = (select max(rowid) from __drizzle_migrations)`,
  );
  const answer = GET();
  expect(answer.status).toBe(503);
  expect(await answer.json()).toEqual({
    status: 'unavailable',
    detail: 'The database lacks 1 migration. Restart to apply them.',
  });
});

test('is 503 and names no path when the database does not answer', async () => {
  const client = at.db.$client;
  const prepare = client.prepare;
  client.prepare = () => {
    throw new Error(`unable to open database file ${at.file}`);
  };
  const answer = GET();
  const text = await answer.text();
  client.prepare = prepare;
  expect(answer.status).toBe(503);
  expect(text).toContain('The database does not answer');
  expect(text).not.toContain(at.file);
});
