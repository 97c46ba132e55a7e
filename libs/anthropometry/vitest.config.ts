import { defineConfig } from 'vitest/config';

const conditions = ['source', 'module', 'node', 'development|production'];

export default defineConfig({
  resolve: { conditions },
  ssr: { resolve: { conditions } },
  // Nothing here keeps a state, so modules are loaded once for many files.
  test: {
    include: ['src/**/*.spec.ts'],
    environment: 'node',
    pool: 'threads',
    isolate: false,
    testTimeout: 30_000,
  },
});
