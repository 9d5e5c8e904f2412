import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('..', import.meta.url));

/**
 * Two projects: `unit` runs in Node; `browser` serves the built page and drives a real browser.
 * Component tests (`*.browser.test.ts`) run inside the page: see web-test-runner.config.mjs.
 */
export default defineConfig({
  root,
  cacheDir: 'node_modules/.vite/vitest',
  test: {
    projects: [
      {
        root,
        test: {
          name: 'unit',
          include: ['test/**/*.test.ts'],
          exclude: ['test/browser/**', 'test/**/*.browser.test.ts'],
          testTimeout: 20_000,
        },
      },
      {
        root,
        test: {
          name: 'browser',
          include: ['test/browser/**/*.test.ts'],
          exclude: ['test/**/*.browser.test.ts'],
          globalSetup: ['test/browser/serve.ts'],
          testTimeout: 60_000,
          hookTimeout: 60_000,
          fileParallelism: false,
        },
      },
    ],
  },
});
