import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('../..', import.meta.url));

export default defineConfig({
  root,
  resolve: { alias: { '@': root.replace(/\/$/, ''), 'server-only': `${root}tests/setup/server-only.ts` } },
  test: {
    include: ['tests/**/*.test.ts', 'tests/**/*.test.tsx'],
    exclude: ['tests/e2e/**', 'node_modules/**'],
    testTimeout: 30_000,
    env: { NODE_ENV: 'test' },
    setupFiles: ['tests/setup/test-env.ts'],
  },
});
