/**
 * `npm test`: every check there is, in order, each streaming its output. A failing step does not
 * stop the later ones. The last line is `N passed, N failed`; the exit code is 1 if anything failed.
 */
import { spawn } from 'node:child_process';
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { contribution, countVitest, sumOf } from './tally.mjs';

const root = fileURLToPath(new URL('../..', import.meta.url));
const results = join(root, 'dist/results');
process.chdir(root);

/** @param {string} project */
const vitest = (project) =>
  `vitest run --config test/vitest.config.ts --project ${project} --reporter=default ` +
  `--reporter=json --outputFile.json=dist/results/${project}.json`;
const vite = 'vite build --config components/vite.config.ts --logLevel warn';

/** @type {{ name: string, commands: string[], report?: string }[]} */
const steps = [
  { name: 'compile', commands: ['tsc -b'] },
  { name: 'style', commands: ['biome check --config-path=test --error-on-warnings .'] },
  { name: 'find a browser', commands: ['node test/tools/find-browser.mjs'] },
  { name: 'unit tests', commands: [vitest('unit')], report: 'unit.json' },
  {
    name: 'component tests',
    commands: ['wtr --config test/web-test-runner.config.mjs'],
    report: 'components.json',
  },
  { name: 'build', commands: [vite, `${vite} --mode offline`] },
  { name: 'browser tests', commands: [vitest('browser')], report: 'browser.json' },
];

/**
 * Runs one command line with the project's tools on PATH; resolves to its exit code.
 * @param {string} line
 * @returns {Promise<number>}
 */
function run(line) {
  const [command, ...args] = line.split(' ');
  const PATH = [join(root, 'node_modules/.bin'), process.env.PATH].join(delimiter);
  const child = spawn(command ?? '', args, {
    stdio: 'inherit',
    env: { ...process.env, PATH },
    shell: process.platform === 'win32',
  });
  return new Promise((done) => {
    child.on('error', () => done(127));
    child.on('close', (code) => done(code ?? 1));
  });
}

/** @param {string} name */
function readTotals(name) {
  const path = join(results, name);
  if (!existsSync(path)) return null;
  const report = JSON.parse(readFileSync(path, 'utf8'));
  return 'testResults' in report ? countVitest(report) : report;
}

// A deleted output is not written again while its build information remains, so all of it goes.
rmSync(join(root, 'dist'), { recursive: true, force: true });
mkdirSync(results, { recursive: true });

/** @type {(import('./tally.mjs').Outcome & { seconds: number })[]} */
const outcomes = [];
for (const { name, commands, report } of steps) {
  console.log(`\n── ${name} ──`);
  const started = performance.now();
  let exitCode = 0;
  for (const command of commands) exitCode ||= await run(command);
  const totals = report ? readTotals(report) : null;
  const seconds = (performance.now() - started) / 1000;
  outcomes.push({ name, runsTests: report !== undefined, exitCode, totals, seconds });
}

console.log('\n── summary ──');
for (const outcome of outcomes) {
  const { passed, failed, skipped } = contribution(outcome);
  const counted = outcome.runsTests || failed > 0;
  const words = counted ? `${passed} passed, ${failed} failed, ${skipped} skipped` : 'done';
  console.log(`${outcome.name.padEnd(16)}${outcome.seconds.toFixed(1).padStart(7)} s   ${words}`);
}
const sum = sumOf(outcomes);
console.log(`\n${sum.passed} passed, ${sum.failed} failed`);
process.exitCode = sum.failed > 0 ? 1 : 0;
