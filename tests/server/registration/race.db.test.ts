import { fork } from 'node:child_process';
import { expect, test } from 'vitest';
import { order, registration } from '@/db/schema/order';
import { workshop } from '@/db/schema/workshop';
import { checkBooks } from '@/lib/server/orders/check-books';
import { countPlaces } from '@/lib/server/registration/count-places';
import { answersFor, buildDraft } from '@/tests/builders/build-draft';
import { buildFarCamp } from '@/tests/builders/checkout-desk';
import { useTestDatabase } from '@/tests/setup/test-database';

const at = useTestDatabase();

/** Starts a buyer, waits for its "ready", and gives a trigger that runs it to its end. */
async function buyer(tokens: string[]) {
  const child = fork('tests/server/registration/race-buyer.ts', [tokens.join()], {
    execArgv: ['--import', 'tsx'],
    env: { ...process.env, COMBWOOD_DB: at.file, TSX_TSCONFIG_PATH: 'tests/setup/tsconfig.json' },
  });
  await new Promise((resolve, reject) => {
    child.once('message', resolve);
    child.once('error', reject);
    child.once('exit', reject);
  });
  return () =>
    new Promise<Record<string, number>>((resolve, reject) => {
      child.once('message', (told) => resolve(told as Record<string, number>));
      child.once('error', reject);
      child.send('go');
    });
}

async function race(drafts: string[], processes: number): Promise<Record<string, number>> {
  const share = Math.ceil(drafts.length / processes);
  const buyers = [];
  for (let of = 0; of < processes; of += 1)
    buyers.push(await buyer(drafts.slice(of * share, (of + 1) * share)));
  const sum: Record<string, number> = {};
  for (const told of await Promise.all(buyers.map((go) => go())))
    for (const [outcome, times] of Object.entries(told)) sum[outcome] = (sum[outcome] ?? 0) + times;
  return sum;
}

// Assurance 1.3, 2.2; ASVS 2.3.4. With deferred transactions the same race ends in hundreds of busy errors.
test('500 people race for 60 places from several processes: 60 get one, the rest are told, no errors', async () => {
  const { campId, benders } = buildFarCamp(at.db, { capacity: 60 });
  at.db.$client.exec('update track set capacity = 100');
  const drafts = Array.from({ length: 500 }, (_, n) => `person${n}`);
  for (const token of drafts)
    buildDraft(at.db, { token, campId, answers: answersFor(benders, { email: `${token}@example.test` }) });
  expect(await race(drafts, 6)).toEqual({ held: 60, camp_full: 440 });
  expect(countPlaces(campId)?.camp).toEqual({ capacity: 60, taken: 60, left: 0 });
  expect(at.db.select().from(registration).all()).toHaveLength(60);
  expect(checkBooks()).toEqual([]);
}, 120_000);

test('ten seats of an elective and a track of twenty: nobody gets half of what they asked for', async () => {
  const { campId, benders, beginners } = buildFarCamp(at.db, { capacity: 60 });
  at.db.$client.exec(`update track set capacity = 20 where id = '${benders}'`);
  at.db
    .insert(workshop)
    .values({
      id: 'wsh_e',
      campId,
      title: 'Reed repair',
      kind: 'repair-bench',
      audience: 'elective',
      lengthMinutes: 60,
      capacity: 10,
    })
    .run();
  const drafts = Array.from({ length: 120 }, (_, n) => `person${n}`);
  for (const [n, token] of drafts.entries())
    buildDraft(at.db, {
      token,
      campId,
      answers: answersFor(n % 2 ? benders : beginners, { electives: n % 3 ? [] : ['wsh_e'] }),
    });
  const told = await race(drafts, 4);
  expect(Object.keys(told).filter((outcome) => outcome.startsWith('error'))).toEqual([]);
  const places = countPlaces(campId);
  expect(places?.electives).toEqual([{ id: 'wsh_e', places: { capacity: 10, taken: 10, left: 0 } }]);
  expect(places?.tracks.find(({ id }) => id === benders)?.places).toEqual({
    capacity: 20,
    taken: 20,
    left: 0,
  });
  expect(at.db.select().from(order).all()).toHaveLength(told.held ?? 0);
  expect(checkBooks()).toEqual([]);
}, 120_000);

test('the same draft from several processes becomes one order', async () => {
  const { campId, benders } = buildFarCamp(at.db);
  buildDraft(at.db, { token: 'same', campId, answers: answersFor(benders) });
  expect(await race(['same', 'same', 'same', 'same', 'same', 'same'], 3)).toEqual({ held: 6 });
  expect(at.db.select().from(order).all()).toHaveLength(1);
}, 120_000);
