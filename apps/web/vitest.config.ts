import { fileURLToPath } from 'node:url';
import react from '@vitejs/plugin-react';
import { configDefaults, defineConfig } from 'vitest/config';

const conditions = ['source', 'module', 'browser', 'development|production'];
/** Stand in for modules by `vi.mock`, which a module that is loaded already would not feel. */
const ALONE = 'src/**/*.alone.spec.tsx';
/** Ask for what only a browser has, and draw nothing. */
const BROWSER = 'src/**/*.browser.spec.ts';
const page = { environment: 'jsdom', setupFiles: ['src/test/setup.ts'] };

/** Modules are loaded once for many files: loading them takes longer than the tests do. */
export default defineConfig({
  plugins: [react()],
  resolve: {
    alias: { '@': fileURLToPath(new URL('./src', import.meta.url)) },
    conditions,
  },
  test: {
    css: false,
    // Whole forms are filled in; a busy machine needs longer than the usual five seconds.
    testTimeout: 20_000,
    projects: [
      {
        extends: true,
        test: {
          name: 'reckoning',
          include: ['src/**/*.spec.ts'],
          exclude: [...configDefaults.exclude, BROWSER],
          isolate: false,
        },
      },
      {
        extends: true,
        test: {
          ...page,
          name: 'pages',
          include: ['src/**/*.spec.tsx', BROWSER],
          exclude: [...configDefaults.exclude, ALONE],
          isolate: false,
        },
      },
      { extends: true, test: { ...page, name: 'alone', include: [ALONE] } },
    ],
  },
});
