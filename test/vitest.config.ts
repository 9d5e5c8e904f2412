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
          // Node runs the sources itself, which is twice as fast as through Vite's module runner.
          experimental: { viteModuleRunner: false, nodeLoader: false },
          execArgv: ['--import', 'tsx'],
          // Only the desk has decorators.
          env: { TSX_TSCONFIG_PATH: 'components/desk/tsconfig.json' },
          // Pure functions: files share modules, so tables are unpacked once a process.
          isolate: false,
          maxWorkers: '100%',
          // A test that hangs is ended; on a busy machine a heavy one may take its time.
          testTimeout: 60_000,
        },
      },
      {
        root,
        test: {
          name: 'browser',
          include: ['test/browser/**/*.test.ts'],
          exclude: ['test/**/*.browser.test.ts'],
          globalSetup: ['test/browser/serve.ts'],
          testTimeout: 120_000,
          hookTimeout: 120_000,
          // Two browsers at a time: each file judges what came first, none how long it took.
          maxWorkers: 2,
        },
      },
    ],
  },
});
