import { type ChildProcess, fork, spawnSync } from 'node:child_process';
import { once } from 'node:events';
import { expect, test } from '@playwright/test';
import Database from 'better-sqlite3';

const PEOPLE = 500;
const PLACES = 60;
const PROCESSES = 5;

const tsx = (...args: string[]) =>
  spawnSync(process.execPath, ['--import', 'tsx', ...args], {
    env: { ...process.env, TSX_TSCONFIG_PATH: 'tests/setup/tsconfig.json' },
    encoding: 'utf8',
  });

async function startBuyer(base: string, tokens: string[]): Promise<ChildProcess> {
  const path = '/camps/kettle-lake-race/register/check';
  const buyer = fork('tests/e2e/race-buyer.mjs', [base, path, tokens.join()]);
  await once(buyer, 'message');
  return buyer;
}

// ASVS 2.3.4 and 15.3.3: the last place is raced for, and what is posted besides the form's own fields does nothing.
test('500 people press the button for 60 places at once: 60 get one, the rest are told, nobody sees an error', async ({
  baseURL,
}) => {
  test.setTimeout(240_000);
  const made = tsx('tests/e2e/race-camp.ts', String(PEOPLE), String(PLACES));
  expect(made.stderr).toBe('');
  const db = new Database(process.env.COMBWOOD_DB ?? '', { timeout: 10_000 });
  try {
    const share = PEOPLE / PROCESSES;
    const tokens = Array.from({ length: PEOPLE }, (_, person) => `race-${person}`);
    const buyers: ChildProcess[] = [];
    for (let of = 0; of < PROCESSES; of += 1)
      buyers.push(await startBuyer(baseURL ?? '', tokens.slice(of * share, (of + 1) * share)));
    const sum: Record<string, number> = {};
    await Promise.all(
      buyers.map(async (buyer) => {
        buyer.send('go');
        const [outcomes] = (await once(buyer, 'message')) as [Record<string, number>];
        for (const [outcome, times] of Object.entries(outcomes)) sum[outcome] = (sum[outcome] ?? 0) + times;
      }),
    );
    expect(sum).toEqual({ held: PLACES, 'told it is full': PEOPLE - PLACES });
    expect(
      db
        .prepare(
          `select count(*) as orders, min(total) as low, max(total) as high, count(distinct state) as states
           from "order" where camp_id = 'cmp_race' and state = 'held'`,
        )
        .get(),
    ).toEqual({ orders: PLACES, low: 46_000, high: 46_000, states: 1 });
    expect(
      db
        .prepare("select count(*) as n from registration where camp_id = 'cmp_race' and state = 'held'")
        .get(),
    ).toEqual({ n: PLACES });
    const books = tsx('lib/server/orders/check-books-command.ts');
    expect([books.status, books.stderr]).toEqual([0, '']);
  } finally {
    // Out of sight of the tests that follow.
    db.prepare("update camp set state = 'draft' where id = 'cmp_race'").run();
    db.close();
  }
});
