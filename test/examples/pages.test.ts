/**
 * What is written on pages and made from something else: the answers quoted in README.md, the least
 * case, and the table of the case file's keys.
 */
import { readFileSync } from 'node:fs';
import { beforeAll, describe, expect, it } from 'vitest';
import { faultLine, parseCaseText } from '../../physics/case/index.js';
import { weigh } from '../../physics/weigh.js';
import { runCommand } from '../command/run-command.js';
import { caseKeyTable, withCaseKeys } from '../reference/case-keys.js';
import { quotedCommands, withOutputs, wordsOf } from '../reference/readme-outputs.js';
import { readExampleText } from './read-example.js';

const readme = readFileSync(new URL('../../README.md', import.meta.url), 'utf8');

describe('README', () => {
  const outputs = new Map<string, string>();
  beforeAll(async () => {
    for (const words of quotedCommands(readme)) {
      outputs.set(words, (await runCommand(wordsOf(words))).out);
    }
  }, 60_000);

  it('quotes an answer of beam and one of weigh', () => {
    expect([...outputs.keys()].map((words) => words.split(' ')[0])).toEqual(['beam', 'weigh']);
  });

  it('quotes exactly what the commands print today (otherwise: npm run tables)', () => {
    expect(withOutputs(readme, outputs)).toBe(readme);
  });

  it('would not quote a line that is no longer printed', () => {
    const stale = readme.replace('tube load  ', 'tube burden  ');
    expect(() => withOutputs(stale, outputs)).toThrow(/nothing is printed like: .*tube burden/);
  });

  it('names every section of the desk, and links the page of the case file', () => {
    for (const name of ['Sweep', 'Sizes', 'Solve', 'Check by transport']) {
      expect(readme).toContain(`- **${name}**: `);
    }
    expect(readme).toContain('(components/examples/MINIMAL.md)');
  });
});

describe('the page of the case file', () => {
  const page = readExampleText('MINIMAL.md');
  const [, least] = /```json\n([\s\S]*?)```/.exec(page) ?? [];

  it('holds a sound case, weighed without a fault', () => {
    const parsed = parseCaseText(least);
    if ('faults' in parsed) throw new Error(parsed.faults.map(faultLine).join('\n'));
    const { evaluations, calibration } = weigh(parsed);
    expect(evaluations).toHaveLength(4);
    expect(calibration?.findings).toEqual([]);
  });

  it('lists every key with its default and meaning (otherwise: npm run tables)', () => {
    expect(withCaseKeys(page)).toBe(page);
    const keys = caseKeyTable().split('\n').slice(2);
    expect(keys.length).toBeGreaterThan(150);
    expect(new Set(keys).size).toBe(keys.length);
    expect(page).toContain('| `room.tube.anodeAngle_deg` | `12` | ');
    expect(page).toContain('| `patient.layers` | – | ');
  });
});
