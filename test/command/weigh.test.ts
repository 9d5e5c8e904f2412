import { describe, expect, it } from 'vitest';
import type { Weighing } from '../../physics/results.js';
import { brokenCases, soundCase, soundText } from '../physics/case/broken-cases.js';
import { runCommand } from './run-command.js';

const answered = (text: string, ...words: string[]) =>
  runCommand(['weigh', 'x.json', ...words], { 'x.json': text });

/** The worked example with tube loads of its own, each in mAs. */
const withLoads = (current: number, proposed: number): string => {
  const c = soundCase();
  c.techniques[0].control = { tubeLoad_mAs: current };
  c.techniques[1].control = { tubeLoad_mAs: proposed };
  return JSON.stringify(c);
};

describe('stratabeam weigh', () => {
  it('gives every technique at every size and every comparison, at full precision', async () => {
    const { out } = await answered(soundText, '--json');
    const { evaluations, comparisons, case: stamp }: Weighing = JSON.parse(out);
    expect(evaluations.map(({ technique, size }) => [technique, size])).toEqual([
      ['Current', 'median'],
      ['Proposed', 'median'],
    ]);
    expect(comparisons).toHaveLength(1);
    expect(comparisons[0].rows.map(({ holdConstant }) => holdConstant)).toEqual([
      'asSet',
      'sdnr',
      'detectorAirKerma',
      'detectorSignal',
      'incidentAirKerma',
      'tubeLoad',
    ]);
    expect(stamp.hash).toMatch(/^[0-9a-f]{64}$/);
  });

  it('ends with 0 where every technique is allowed', async () => {
    expect((await answered(withLoads(30, 50))).code).toBe(0);
  });

  it('ends with 1, the answer printed, where a Proposed technique is forbidden', async () => {
    const { code, out, err } = await answered(withLoads(30, 500));
    expect({ code, err }).toEqual({ code: 1, err: '' });
    expect(out).toMatch(/limit: Proposed, median: Needs .* kW/);
  });

  it('ends with 0 where only Current is forbidden', async () => {
    const { code, out } = await answered(withLoads(500, 50));
    expect(out).toMatch(/limit: Current/);
    expect(code).toBe(0);
  });

  it('shows people the quantities, the ratios, the findings and what was assumed', async () => {
    const { out } = await answered(soundText);
    for (const part of [
      /^Aortography, abdomen\ncase [0-9a-f]{64}, Stratabeam \d/,
      /\nCalibration: output factor 0\.8\d+, output exponent -?\d\S*, inherent filter 2\.\d+ mm Al\n/,
      /\nSize median, 202 mm\n/,
      /\n {2}incident air kerma +mGy +2\.\d+ +1\.\d+\n/,
      /\nProposed over Current, size median\n/,
      /\nequal detector air kerma +1\.\d+ +0\.\d+/,
      /\nFindings\n/,
      /\n {2}first half-value layer, in vacuum +mm Al +\d/,
      /\n {2}SdNR of the vessel, \d+ mm × \d+ mm +\d/,
      /\nAssumed because the case is silent\n/,
    ]) {
      expect(out).toMatch(part);
    }
    expect(out).not.toMatch(/undefined|NaN/);
  });

  it('names every quantity once', async () => {
    const { out } = await answered(soundText);
    const [, table] = out.split(/\nSize median, 202 mm\n/);
    const names = table
      .split('\nLayers')[0]
      .split('\n')
      .flatMap((line) => /^ {2}(\S.*?) {2,}/.exec(line)?.[1] ?? []);
    expect(names.length).toBeGreaterThan(40);
    expect(new Set(names).size).toBe(names.length);
  });

  it('prints what silence stands for, and in one line what there is none of', async () => {
    const { out } = await answered(soundText);
    const lines = out.split('\nAssumed because the case is silent\n')[1].trimEnd().split('\n');
    expect(lines).toContain('  room.detector.countingThreshold_keV = 20');
    expect(lines).toContain('  task.detail.width_mm = as length_mm; a vessel has none');
    expect(lines.at(-1)).toMatch(/^ {2}none: room\.tube\.rating, .*task\.detail\.material$/);
    expect(lines.filter((line) => line.includes('none: '))).toHaveLength(1);
  });

  it('says which entries of the case no number rests on', async () => {
    const c = soundCase();
    c.monitoring = { quantity: 'incident air kerma', interval: 'monthly' };
    const { out } = await answered(JSON.stringify(c));
    expect(out).toMatch(/\n {2}caution: monitoring: is kept with the case, but no number /);
  });

  it('prints a calibration from which `beam` makes the same beam again', async () => {
    const c = soundCase();
    c.techniques[0].potential_kV = 80;
    c.techniques[0].filter = 'none';
    c.techniques[0].control = { tubeLoad_mAs: 10 };
    const { out } = await answered(JSON.stringify(c));
    expect(out).toMatch(/Calibration: output factor [\d.]+, output exponent -?\d\S*, /);
    const [, words] = /\n {2}stratabeam (beam .*)\n/.exec(out) ?? [];
    const asked = [...words.matchAll(/"([^"]*)"|(\S+)/g)].map(([, quoted, bare]) => quoted ?? bare);
    const alone = (await runCommand(asked)).out;
    const kerma = (text: string, name: RegExp) => name.exec(text)?.[1];
    expect(kerma(alone, /\nair kerma +([\d.]+)/)).toBe(
      kerma(out, /\n {2}air kerma at 1 m, in vacuum +µGy\/mAs +([\d.]+)/),
    );
    expect(kerma(alone, /\naluminium +([\d.]+)/)).toBe(
      kerma(out, /\n {2}first half-value layer, in vacuum +mm Al +([\d.]+)/),
    );
  });

  it('lists one CSV line per technique and size', async () => {
    const { out } = await answered(soundText, '--csv');
    const lines = out.trimEnd().split('\n');
    const width = lines[0].split(',').length;
    expect(lines).toHaveLength(3);
    expect(lines.every((line) => line.split(',').length === width)).toBe(true);
    expect(lines[0]).toMatch(/,dose\.incidentAirKerma_mGy,/);
  });

  it('reads the CSV files that stand beside the case, and no others', async () => {
    const c = soundCase();
    c.patient.sizes = { file: 'sizes.csv' };
    const files = {
      'folder/x.json': JSON.stringify(c),
      'folder/sizes.csv': 'thickness_mm;weight\n190,5;1\n210;2\n',
    };
    const { out } = await runCommand(['weigh', 'folder/x.json'], files);
    expect(out).toMatch(/Size 190\.5 mm, 191 mm/);
    for (const file of ['../secret.csv', '/etc/passwd', '..\\x', 'C:x', '..']) {
      c.patient.sizes = { file };
      const refused = await answered(JSON.stringify(c));
      expect(refused.code).toBe(2);
      expect(refused.err).toMatch(
        /^case: ".*": must be the name of a file in the folder of the case/,
      );
    }
  });

  it.each(brokenCases)('refuses a case with $name, for programs too', async (broken) => {
    const people = await answered(broken.text);
    expect(people.code).toBe(2);
    expect(people.out).toBe('');
    expect(people.err.split('\n')[0]).toContain(`${broken.path}: `);
    expect(people.err.split('\n')[0]).toContain(broken.rule);
    const programs = await answered(broken.text, '--json');
    expect(programs.code).toBe(2);
    expect(programs.out).toBe('');
    const { faults } = JSON.parse(programs.err);
    expect(faults[0].rule).toContain(broken.rule);
    expect(Object.keys(faults[0])).toEqual(['path', 'value', 'rule', 'remedy']);
  });

  it('refuses a path that leads nowhere', async () => {
    const { code, err } = await runCommand(['weigh', 'no/such/file.json']);
    expect(code).toBe(2);
    expect(err).toBe('no/such/file.json: not readable: must be a case file; check the path\n');
  });
});
