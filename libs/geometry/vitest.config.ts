import { defineConfig } from 'vitest/config';

const conditions = ['source', 'module', 'node', 'development|production'];

export default defineConfig({
  resolve: { conditions },
  ssr: { resolve: { conditions } },
  test: { include: ['src/**/*.spec.ts'], environment: 'node', testTimeout: 30_000 },
});
