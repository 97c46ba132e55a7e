import { defineConfig } from 'vitest/config';

/** Journeys in Chromium against the running product; `scripts/test.mjs` gives its address. */
export default defineConfig({
  test: {
    include: ['e2e/**/*.e2e.ts'],
    environment: 'node',
    testTimeout: 120_000,
    hookTimeout: 60_000,
    maxWorkers: 2,
  },
});
