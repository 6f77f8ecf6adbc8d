import { spawnSync } from 'node:child_process';
import { existsSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { ensureChromium } from './ensure-chromium.mjs';
import { ensureBuilt, ensureInstalled, ensureSeeded, ROOT, stackEnv, startStack } from './stack.mjs';

// Everything, in this order: packages, lint, types, vitest, build, browser tests, books. The last line counts.
const port = Number(process.env.TEST_PORT ?? 3900);
const folder = 'data/test';
let passed = 0;
let failed = 0;

const bin = (path) => join(ROOT, 'node_modules', path);
const call = (args, env = {}) =>
  spawnSync(process.execPath, args, {
    cwd: ROOT,
    stdio: 'inherit',
    env: { ...process.env, NEXT_TELEMETRY_DISABLED: '1', ...env },
  }).status === 0;

/** One check that either holds or not. */
function check(name, holds) {
  if (holds) passed += 1;
  else failed += 1;
  console.log(`${holds ? 'passed' : 'FAILED'}: ${name}`);
}

/** Adds a JSON report's counts; a run that broke off before it could write one counts as a failure. */
function tally(name, file, count, ended) {
  if (!existsSync(file)) return check(`${name} (no report was written)`, false);
  const counted = count(JSON.parse(readFileSync(file, 'utf8')));
  passed += counted.passed;
  failed += counted.failed;
  if (!ended && counted.failed === 0) check(`${name} ended cleanly`, false);
}

try {
  ensureInstalled();
  check('lint and format', call([bin('@biomejs/biome/bin/biome'), 'check', '.', '--diagnostic-level=error']));
  check(
    'types',
    call([bin('next/dist/bin/next'), 'typegen']) && call([bin('typescript/bin/tsc'), '--noEmit']),
  );

  const units = join(ROOT, 'data/vitest.json');
  rmSync(units, { force: true });
  const unitsEnded = call([
    bin('vitest/vitest.mjs'),
    'run',
    '-c',
    'tests/setup/vitest.config.ts',
    '--reporter=default',
    '--reporter=json',
    `--outputFile=${units}`,
  ]);
  tally(
    'vitest',
    units,
    (report) => ({
      passed: report.numPassedTests,
      failed: report.numFailedTests + report.numFailedTestSuites * (report.numFailedTests === 0 ? 1 : 0),
    }),
    unitsEnded,
  );

  ensureBuilt();
  check('production build', true);
  const env = stackEnv(port, folder);
  ensureSeeded(folder, env, true);
  const chromium = ensureChromium();
  const { stop, at } = await startStack(port, env);
  try {
    const browser = join(ROOT, 'tests/e2e/results/report.json');
    rmSync(browser, { force: true });
    const browserEnded = call(
      [bin('@playwright/test/cli.js'), 'test', '-c', 'tests/setup/playwright.config.ts'],
      {
        ...env,
        E2E_APP_URL: at.app,
        E2E_PAY_URL: at.pay,
        E2E_MAIL_URL: at.mail,
        CHROMIUM_PATH: chromium ?? '',
      },
    );
    tally(
      'browser tests',
      browser,
      ({ stats }) => ({ passed: stats.expected + stats.flaky, failed: stats.unexpected }),
      browserEnded,
    );
    check(
      'check:books after the browser tests',
      call(
        [
          bin('tsx/dist/cli.mjs'),
          '--tsconfig',
          'tests/setup/tsconfig.json',
          'lib/server/orders/check-books-command.ts',
        ],
        env,
      ),
    );
  } finally {
    await stop();
  }
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  failed += 1;
}
console.log(`${passed} passed, ${failed} failed`);
process.exit(failed === 0 ? 0 : 1);
