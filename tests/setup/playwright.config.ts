import { defineConfig } from '@playwright/test';
import { CHROMIUM_ARGS } from './chromium-args';

/** Started by run-tests.mjs, which has the stack running and gives its addresses by environment. */
export default defineConfig({
  testDir: '../e2e',
  outputDir: '../e2e/results',
  timeout: 90_000,
  expect: { timeout: 15_000 },
  // One stack, one database: browser tests follow each other.
  workers: 1,
  fullyParallel: false,
  forbidOnly: true,
  retries: 0,
  reporter: [['list'], ['json', { outputFile: '../e2e/results/report.json' }]],
  use: {
    baseURL: process.env.E2E_APP_URL ?? 'http://localhost:3000',
    actionTimeout: 20_000,
    navigationTimeout: 30_000,
    trace: 'retain-on-failure',
    screenshot: 'only-on-failure',
    launchOptions: { executablePath: process.env.CHROMIUM_PATH || undefined, args: CHROMIUM_ARGS },
  },
});
