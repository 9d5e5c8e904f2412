/**
 * Component tests: `*.browser.test.ts` run inside a real browser under mocha and chai. Vite serves
 * the sources, as it does for the desk, so decorators and CommonJS packages behave the same.
 */
import { fileURLToPath } from 'node:url';
import { chromeLauncher, summaryReporter } from '@web/test-runner';
import { createServer } from 'vite';
import { browserFlags } from './tools/browser-flags.mjs';
import { findBrowser } from './tools/find-browser.mjs';
import { resultsReporter } from './tools/results-reporter.mjs';

const root = fileURLToPath(new URL('..', import.meta.url));

const vite = await createServer({
  root,
  configFile: fileURLToPath(new URL('../components/vite.config.ts', import.meta.url)),
  cacheDir: fileURLToPath(new URL('../node_modules/.vite/components', import.meta.url)),
  appType: 'custom',
  logLevel: 'error',
  server: { middlewareMode: true, hmr: false, ws: false, watch: null },
  optimizeDeps: {
    entries: [
      'test/**/*.browser.test.ts',
      'components/{desk,charts,dossier,store,workers}/**/*.ts',
    ],
  },
});

/**
 * Hands everything but the runner's own pages to Vite.
 * @type {import('@web/dev-server-core').Middleware}
 */
const viteMiddleware = async (ctx, next) => {
  if (ctx.path === '/' || ctx.path.startsWith('/__web-')) return next();
  ctx.respond = false;
  ctx.status = 200;
  await new Promise((done) => {
    ctx.res.once('close', done);
    vite.middlewares(ctx.req, ctx.res, () => {
      ctx.respond = true;
      ctx.status = 404;
      done(next());
    });
  });
};

/** @type {import('@web/test-runner').TestRunnerConfig} */
const config = {
  rootDir: root,
  files: ['test/**/*.browser.test.ts'],
  nodeResolve: false,
  watch: false,
  // A page behind another is not drawn, and its tests would wait for a frame that never comes.
  concurrency: 1,
  middleware: [viteMiddleware],
  plugins: [{ name: 'close-vite', serverStop: () => vite.close() }],
  browsers: [
    chromeLauncher({ launchOptions: { executablePath: findBrowser(), args: browserFlags() } }),
  ],
  filterBrowserLogs: ({ args }) => !String(args[0]).startsWith('Lit is in dev mode'),
  testFramework: { config: { ui: 'bdd', timeout: 60_000 } },
  testsFinishTimeout: 600_000,
  reporters: [summaryReporter({}), resultsReporter('dist/results/components.json')],
};

export default config;
