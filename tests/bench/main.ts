import { join } from 'node:path';
import { ensureBuilt, ensureSeeded, ROOT, stackEnv, startStack } from '../setup/stack.mjs';
import { startBareServer } from './bare-server';
import { fillBench } from './fill-bench';
import { measureArrival } from './measure-arrival';
import { measureCampPage } from './measure-camp-page';
import { measurePacking } from './measure-packing';
import { measurePageScript } from './measure-page-script';
import { measurePeople } from './measure-people';
import { measureRegistration } from './measure-registration';
import { measureRoster } from './measure-roster';
import { measureStatements } from './measure-statements';
import { printReport, type Row } from './report';

// Ratios in one run, so that a slow machine is slow on both sides. Not a timed test: it fails only where something
// could not be measured. `npm run bench -- roster packing` measures those alone.
const port = Number(process.env.BENCH_PORT ?? 3960);
const folder = 'data/bench';
const work = join(ROOT, folder, 'work');
const wanted = process.argv.slice(2);
const rows: Row[] = [];
const failed: string[] = [];

async function measure(name: string, run: () => Row[] | Promise<Row[]>): Promise<void> {
  if (wanted.length > 0 && !wanted.includes(name)) return;
  console.log(`Measuring ${name} …`);
  try {
    rows.push(...(await run()));
  } catch (error) {
    failed.push(`${name}: ${error instanceof Error ? error.message : String(error)}`);
  }
}

const OVER_HTTP = {
  'camp-page': measureCampPage,
  script: measurePageScript,
  people: measurePeople,
  arrival: measureArrival,
};

async function overHttp(): Promise<void> {
  if (wanted.length > 0 && !wanted.some((name) => name in OVER_HTTP)) return;
  ensureBuilt();
  const env = stackEnv(port, folder);
  ensureSeeded(folder, env, true);
  const filled = fillBench(env.COMBWOOD_DB);
  const stops: (() => Promise<void>)[] = [];
  try {
    const bare = await startBareServer('data/bench-bare', port + 4);
    stops.push(bare.stop);
    const { stop, at } = await startStack(port, env, { quiet: true });
    stops.push(stop);
    const stage = { app: at.app, bare: bare.url, file: env.COMBWOOD_DB, ...filled };
    for (const [name, run] of Object.entries(OVER_HTTP)) await measure(name, () => run(stage));
  } finally {
    await Promise.all(stops.map((stop) => stop()));
  }
}

try {
  Object.assign(process.env, stackEnv(port, folder));
  await overHttp();
  await measure('registration', () => measureRegistration(work));
  await measure('roster', () => measureRoster(work));
  await measure('packing', () => measurePacking(work));
  await measure('statements', () => measureStatements(work));
} catch (error) {
  failed.push(error instanceof Error ? error.message : String(error));
}
printReport(rows);
for (const line of failed) console.error(`Could not be measured: ${line}`);
process.exit(failed.length === 0 ? 0 : 1);
