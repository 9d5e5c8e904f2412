import { describe, expect, it } from 'vitest';
import type { Sweep } from '../../physics/sweep.js';
import { sampleJson } from '../physics/sample-case.js';
import { jsonOf, runCommand } from './run-command.js';

const small = {
  ...sampleJson,
  room: {
    ...sampleJson.room,
    tube: { potential_kV: { min: 50, max: 120, step: 10 }, power_kW: 30 },
  },
  patient: {
    ...sampleJson.patient,
    sizes: [
      { name: 'small', thickness_mm: 150 },
      { name: 'large', thickness_mm: 250 },
    ],
  },
};
const files = { 'x.json': JSON.stringify(small) };
const swept = async (...words: string[]): Promise<Sweep> =>
  JSON.parse((await runCommand(['sweep', 'x.json', '--json', ...words], files)).out) as Sweep;

describe('stratabeam sweep', () => {
  it('gives every setting at every size, and the frontier, in the contract’s form', async () => {
    const { axes, settings, frontier } = await swept();
    expect(axes).toEqual({
      potential_kV: [50, 60, 70, 80, 90, 100, 110, 120],
      filter: ['none', '0.1 Cu', '0.3 Cu', '0.9 Cu'],
      size: ['small', 'large'],
    });
    expect(settings).toHaveLength(8 * 4 * 2);
    expect(Object.keys(settings[0])).toEqual(
      expect.arrayContaining([
        'potential_kV',
        'filter',
        'size',
        'values',
        'findings',
        'onFrontier',
      ]),
    );
    expect(frontier.costs).toEqual(['incidentAirKerma', 'tubeLoad']);
    expect(frontier.members.length).toBeGreaterThan(0);
    expect(settings.filter(({ onFrontier }) => onFrontier)).toEqual(frontier.members);
  });

  it('takes the potentials, filters, sizes, condition and costs it is given', async () => {
    const words = ['--potential', '60:100:20', '--filters', 'none,0.3 Cu', '--sizes', 'large'];
    const more = ['--hold', 'detectorAirKerma', '--costs', 'energyImparted,power'];
    const { axes, holdConstant, frontier, settings } = await swept(...words, ...more);
    expect(axes).toEqual({
      potential_kV: [60, 80, 100],
      filter: ['none', '0.3 Cu'],
      size: ['large'],
    });
    expect(holdConstant).toBe('detectorAirKerma');
    expect(frontier.costs).toEqual(['energyImparted', 'power']);
    for (const { values } of settings) expect(values?.detectorAirKerma_uGy).toBeCloseTo(2.5, 9);
    expect((await swept('--potential', '70,60')).axes.potential_kV).toEqual([60, 70]);
  });

  it('shows people the best settings with their windows, the frontier and what is forbidden', async () => {
    const { out, code } = await runCommand(['sweep', 'x.json'], files);
    expect(code).toBe(0);
    for (const part of [
      /equal SdNR; one frame/,
      /\nSize large: best allowed setting by SdNR² per …/,
      /\nincident air kerma +\d+ kV, .* \d+–\d+ /,
      /\nFrontier by incident air kerma, tube load and SdNR: \d+ of 32 settings/,
      /\d+ of 32 settings are forbidden: \d+ beyond tube power/,
    ]) {
      expect(out).toMatch(part);
    }
    expect(out).not.toMatch(/undefined|NaN/);
  });

  it('lists one CSV line per setting and size, the condition in each', async () => {
    const { out } = await runCommand(['sweep', 'x.json', '--csv'], files);
    const lines = out.trimEnd().split('\n');
    expect(lines).toHaveLength(1 + 64);
    expect(lines[0]).toMatch(/^size,filter,potential_kV,holdConstant,tubeLoad_mAs/);
    expect(lines.slice(1).every((line) => line.includes(',sdnr,'))).toBe(true);
    const forbidden = lines.slice(1).find((line) => line.includes(',power'));
    expect(forbidden).toMatch(/,power[^,]*,"\d+ kV, /);
  });

  it('labels an investigational agent', async () => {
    const agent = { name: 'gold', amount: { value: 10, unit: 'mg element/mL' } };
    const task = { detail: { ...small.task.detail, agent } };
    const own = { 'x.json': JSON.stringify({ ...small, task }) };
    const { out } = await runCommand(['sweep', 'x.json', '--sizes', 'small'], own);
    expect(out).toContain('gold: investigational agent, not in clinical use');
  });

  it.each([
    [['--potential', '60:x'], /^--potential: "60:x": must be numbers in kV; write it as/],
    [['--potential', '60:50'], /must rise, with a step above 0/],
    [['--potential', '10:50:5'], /must lie between 20 and 150 kV/],
    [['--filters', '0.1 cu'], /must be one of none, 0\.1 Cu.*; did you mean "0\.1 Cu"\?/],
    [['--sizes', 'huge'], /^--sizes: "huge": must be one of small, large; /],
    [['--hold', 'contrast'], /^--hold: "contrast": must be one of asSet, sdnr/],
    [['--costs', 'dose'], /^--costs: "dose": must be one of incidentAirKerma/],
  ])('refuses %j', async (words, line) => {
    const { code, out, err } = await runCommand(['sweep', 'x.json', ...words], files);
    expect({ code, out }).toEqual({ code: 2, out: '' });
    expect(err).toMatch(line);
  });

  it('sweeps a shipped example', async () => {
    const path = 'components/examples/chest-line.case.json';
    const answer = await jsonOf(['sweep', path, '--potential', '70:120:25', '--filters', 'none']);
    expect(Object.keys(answer)).toEqual(
      expect.arrayContaining(['case', 'version', 'axes', 'settings', 'frontier']),
    );
  });
});
