import { describe, expect, it } from 'vitest';
import type { CheckReport } from '../../physics/check-by-transport/index.js';
import { sampleJson } from '../physics/sample-case.js';
import { runCommand } from './run-command.js';

const text = JSON.stringify(sampleJson);
/** One worker unless told otherwise: a thread that runs from source takes a second to start. */
const answered = (...words: string[]) =>
  runCommand(['transport', 'x.json', '--workers', '1', ...words], { 'x.json': text });

/** An answer with everything but the speed, which no two runs share. */
const bits = (out: string): CheckReport => ({ ...JSON.parse(out), photonsPerSecond: null });

describe('stratabeam transport', () => {
  it('gives every part of the answer that programs rely on', async () => {
    const { out, err } = await answered('--photons', '2e4', '--json');
    expect(err).toBe('');
    const answer: CheckReport & { version: string } = JSON.parse(out);
    expect(answer).toMatchObject({
      technique: 'Current',
      size: 'as drawn',
      photons: 20_000,
      seed: 1,
    });
    for (const { value, standardError } of [answer.spr, answer.backscatterFactor]) {
      expect(value).toBeGreaterThan(1);
      expect(standardError).toBeGreaterThan(0);
      expect(standardError).toBeLessThan(0.1 * value);
    }
    expect(answer.scatterFraction).toBeCloseTo(answer.spr.value / (1 + answer.spr.value), 12);
    const { sum, ...shares } = answer.energyBalance;
    expect(Object.keys(shares)).toEqual([
      'absorbed',
      'escapedEntrance',
      'escapedSide',
      'transmittedPrimary',
      'transmittedScatter',
    ]);
    expect(sum).toBeCloseTo(1, 9);
    expect(answer.layers).toHaveLength(1);
    expect(answer.layers[0]).toMatchObject({ layer: 'water' });
    expect(answer.layers[0].absorbedDose_mGy_per_mGyIncident).toBeGreaterThan(0.1);
    expect(answer.layers[0].energyPerPhoton_keV).toBeGreaterThan(10);
    expect(answer.layers[0].standardError).toBeGreaterThan(0);
    expect(answer.estimate.spr).toBeGreaterThan(1);
    expect(answer.photonsPerSecond).toBeGreaterThan(1000);
    expect(answer.version).toMatch(/^\d/);
  });

  it('gives the same bits with one worker and with two', async () => {
    const flown = (workers: string) =>
      answered('--photons', '4000', '--seed', '7', '--workers', workers, '--json');
    const [one, two] = await Promise.all([flown('1'), flown('2')]);
    expect(bits(two.out)).toEqual(bits(one.out));
  });

  it('flies the technique and size it is told', async () => {
    const { out } = await answered('--photons', '1000', '--technique', 'Proposed', '--json');
    expect(JSON.parse(out)).toMatchObject({
      technique: 'Proposed',
      setting: '70 kV, 0.3 Cu, grid in',
    });
  });

  it('shows people the values, a verdict each, and where the energy went', async () => {
    const { out } = await answered('--photons', '2e4');
    for (const part of [
      /^Water with iodine \(invented\)\ncase [0-9a-f]{64}, Stratabeam \d/,
      /\nCurrent, 80 kV, no filter, grid in, size as drawn\n20000 photons, seed 1, \d+ photons\/s\n/,
      /\nscatter to primary, behind grid +(agrees within|not yet decided|differs by)/,
      /\nabsorbed dose, central column, water +transport alone +mGy +–/,
      /± 1 s\.e\. +difference % +s\.e\.s +to decide\n/,
      /\nA verdict falls once 2 s\.e\. fit into the stated accuracy: /,
      /\nfound again +100\.000\n/,
    ]) {
      expect(out).toMatch(part);
    }
  });

  it('gives one CSV line a quantity', async () => {
    const { out } = await answered('--photons', '1000', '--csv');
    const [heading, ...lines] = out.trimEnd().split('\n');
    expect(heading).toMatch(/^technique,size,photons,seed,quantity,layer,unit,estimate,transport,/);
    expect(lines.map((line) => line.split(',')[4])).toEqual([
      'spr',
      'sprBehindGrid',
      'scatterFraction',
      'backscatterFactor',
      'energyImparted',
      'layerAbsorbedDose',
      'columnAbsorbedDose',
    ]);
  });

  it('tells how far it has come where someone looks, and clears the line', async () => {
    const lines: string[] = [];
    const { run } = await import('../../components/command/run.js');
    await run(['transport', 'x.json', '--photons', '40000', '--workers', '1'], {
      out: () => undefined,
      err: () => undefined,
      readFile: () => text,
      progress: (line) => lines.push(line),
    });
    expect(lines.length).toBeGreaterThan(1);
    expect(lines[0]).toMatch(/ of 40 thousand photons/);
    expect(lines.at(-1)).toBe('');
  });

  it.each([
    ['--photons', '10', /^--photons: "10": must be a number, 1000 to/],
    ['--photons', '1000.5', /^--photons: "1000.5": must be a whole number; /],
    ['--seed', '-1', /^--seed: "-1": must be a number, 0 to/],
    [
      '--technique',
      'Curent',
      /^--technique: "Curent": must be one of Current, Proposed; did you mean "Current"\?\n$/,
    ],
    ['--size', 'huge', /^--size: "huge": must be one of as drawn; choose one of them\n$/],
  ])('refuses %s %s in one clear line', async (option, value, line) => {
    const { code, out, err } = await answered(option, value);
    expect({ code, out }).toEqual({ code: 2, out: '' });
    expect(err).toMatch(line);
  });

  it('refuses a beam it has no tables for', async () => {
    const source = {
      kind: 'lines',
      lines: [
        [1173.2, 1],
        [1332.5, 1],
      ],
    };
    const room = { ...sampleJson.room, source, grid: null };
    const { code, err } = await runCommand(['transport', 'x.json', '--workers', '1'], {
      'x.json': JSON.stringify({ ...sampleJson, room }),
    });
    expect(code).toBe(2);
    expect(err).toMatch(/1173\.2 keV/);
  });
});
