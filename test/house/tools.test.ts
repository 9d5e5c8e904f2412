import { chmodSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { delimiter, join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { compete, quantile } from '../bench/bench.js';
import { presentBrowser } from '../tools/find-browser.mjs';
import { countSessions } from '../tools/results-reporter.mjs';
import { contribution, countVitest, sumOf } from '../tools/tally.mjs';

describe('the browser finder', () => {
  const folder = mkdtempSync(join(tmpdir(), 'stratabeam-finder-'));
  const make = (name: string, mode: number) => {
    const path = join(folder, name);
    writeFileSync(path, '');
    chmodSync(path, mode);
    return path;
  };
  const named = make('my-browser', 0o755);
  const onPath = make('google-chrome', 0o755);
  const fixed = make('elsewhere', 0o755);
  const plain = make('not-executable', 0o644);
  afterAll(() => rmSync(folder, { recursive: true }));

  test('takes CHROME_PATH before PATH and PATH before the usual places', () => {
    const PATH = ['/nowhere', folder].join(delimiter);
    expect(presentBrowser({ CHROME_PATH: named, PATH }, [fixed])).toBe(named);
    expect(presentBrowser({ PATH }, [fixed])).toBe(onPath);
    expect(presentBrowser({ PATH: '/nowhere' }, [fixed])).toBe(fixed);
  });

  test('finds nothing where nothing can be executed', () => {
    expect(presentBrowser({ PATH: '' }, [plain, folder, join(folder, 'absent')])).toBeUndefined();
  });
});

describe('the tally', () => {
  const file = (status: string, ...tests: string[]) => ({
    status,
    assertionResults: tests.map((each) => ({ status: each })),
  });
  const step = (
    exitCode: number,
    totals: { passed: number; failed: number; skipped: number } | null,
    runsTests = true,
  ) => ({ name: 'step', runsTests, exitCode, totals });

  test('counts tests, and a file that could not be collected as one failure', () => {
    const report = {
      testResults: [
        file('passed', 'passed', 'passed', 'skipped'),
        file('failed', 'failed', 'passed'),
      ],
    };
    expect(countVitest(report)).toEqual({ passed: 3, failed: 1, skipped: 1 });
    expect(countVitest({ testResults: [file('failed')] }).failed).toBe(1);
  });

  test('counts nested suites, and a session that failed outside its tests as one failure', () => {
    const result = (passed: boolean, skipped = false) => ({ name: 'test', passed, skipped });
    const suite = {
      name: '',
      tests: [result(true)],
      suites: [{ name: '', suites: [], tests: [result(false), result(false, true)] }],
    };
    const session = { passed: false, testResults: suite };
    const broken = { passed: false };
    expect(countSessions([session, broken] as never)).toEqual({ passed: 1, failed: 2, skipped: 1 });
  });

  test('a test step that ran no test is a failure', () => {
    expect(contribution(step(0, null)).failed).toBe(1);
    expect(contribution(step(0, { passed: 0, failed: 0, skipped: 4 })).failed).toBe(1);
  });

  test('a step that fails without naming a failed test is a failure', () => {
    expect(contribution(step(1, { passed: 5, failed: 0, skipped: 0 })).failed).toBe(1);
    expect(contribution(step(2, null, false)).failed).toBe(1);
  });

  test('a failed test is counted once, and a check without tests not at all', () => {
    const outcomes = [step(1, { passed: 5, failed: 2, skipped: 1 }), step(0, null, false)];
    expect(sumOf(outcomes)).toEqual({ passed: 5, failed: 2, skipped: 1 });
  });
});

describe('the bench', () => {
  test('interpolates quantiles', () => {
    expect(quantile([4, 1, 3, 2], 0.5)).toBe(2.5);
    expect(quantile([7], 0.9)).toBe(7);
  });

  test('gives the ratio of the work of two contenders under a clock that counts work', () => {
    let work = 0;
    const contender = (name: string, units: number) => ({
      name,
      run: () => {
        work += units;
        return work;
      },
    });
    const results = compete(
      { title: 'units', contenders: [contender('two', 2), contender('six', 6)] },
      { now: () => work },
    );
    expect(results.map(({ ratio }) => ratio)).toEqual([1, 3]);
    expect(results.map(({ time_ms }) => time_ms)).toEqual([2, 6]);
  });
});
