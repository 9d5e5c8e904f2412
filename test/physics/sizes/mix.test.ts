import { describe, expect, it } from 'vitest';
import type { Case } from '../../../physics/case/schema.js';
import {
  mixOutcomes,
  outcomeSentence,
  percentileResults,
  percentileThickness_mm,
} from '../../../physics/sizes.js';
import { weigh } from '../../../physics/weigh.js';
import { sampleCase } from '../sample-case.js';

const sizes = [
  { name: 'thin', thickness_mm: 150, weight: 1 },
  { name: 'middle', thickness_mm: 200, weight: 2 },
  { name: 'thick', thickness_mm: 300, weight: 1 },
];
const c = sampleCase({
  room: { tube: { potential_kV: { min: 60, max: 100, step: 10 } } },
  patient: { sizes },
}).case;
const weighed = (of: Case) => weigh({ case: of, assumed: [] });
const { evaluations, comparisons } = weighed(c);
const kerma = (technique: string) =>
  evaluations
    .filter((one) => one.technique === technique)
    .map(({ dose }) => dose.perRun.incidentAirKerma_mGy);

describe('percentiles of the mix', () => {
  it('put each size at the middle of its share', () => {
    expect(percentileThickness_mm(sizes, 12.5)).toBe(150);
    expect(percentileThickness_mm(sizes, 50)).toBe(200);
    expect(percentileThickness_mm(sizes, 31.25)).toBe(175);
    expect(percentileThickness_mm(sizes, 99)).toBe(300);
  });

  it('are evaluated at their own thickness, P5, P50 and P95', () => {
    const results = percentileResults(c);
    expect(results.map(({ percentile }) => percentile)).toEqual([5, 50, 95]);
    expect(results.map(({ thickness_mm }) => thickness_mm)).toEqual([150, 200, 300]);
    expect(results[1].evaluations[0].sdnr).toBe(evaluations[2].sdnr);
    expect(results[1].comparisons[0].rows).toHaveLength(6);
  });

  it('are not asked of a single size', () => {
    expect(percentileResults(sampleCase().case)).toEqual([]);
  });
});

describe('what a technique means for the mix', () => {
  const { outcomes, table } = mixOutcomes(c, evaluations, comparisons);

  it('averages the saving over patients, not over sizes: Σw·K(proposed)/Σw·K(current)', () => {
    const [before, after] = [kerma('Current'), kerma('Proposed')];
    const weights = [0.25, 0.5, 0.25];
    const sum = (values: number[]) => values.reduce((s, value, i) => s + weights[i] * value, 0);
    expect(outcomes[0].incidentAirKermaRatio).toBeCloseTo(sum(after) / sum(before), 12);
    expect(outcomes[0].comparedShare).toBe(1);
  });

  it('counts patients worse off and patients the room forbids by their share', () => {
    const worse = { ...c.techniques[1], control: { detectorAirKerma_uGy: 8 } };
    const heavy = { ...c, techniques: [c.techniques[0], worse] };
    const [outcome] = mixOutcomes(heavy, weighed(heavy).evaluations).outcomes;
    expect(outcome.worseOffShare).toBe(1);
    expect(outcome.infeasibleSizes).toEqual(['thick']);
    expect(outcome.infeasibleShare).toBe(0.25);
    expect(outcomeSentence(outcome)).toMatch(/100 % of patients worse off, 25 % at sizes/);
  });

  it('tabulates what the room would need, size by size', () => {
    expect(table).toHaveLength(6);
    const row = table[3];
    expect(row).toMatchObject({ size: 'middle', technique: 'Proposed', filter: '0.3 Cu' });
    expect(((row.tubeCurrent_mA ?? 0) * (row.exposureTime_ms ?? 0)) / 1000).toBeCloseTo(
      row.tubeLoad_mAs,
      9,
    );
  });

  it('says what detector air kerma would give Current’s SdNR: held there, SdNR is equal', () => {
    const [current, proposed] = [table[2], table[3]];
    const control = { detectorAirKerma_uGy: proposed.detectorAirKermaAtEqualSdnr_uGy ?? 0 };
    const held = { ...c, techniques: [c.techniques[0], { ...c.techniques[1], control }] };
    const again = weighed(held).evaluations.filter(({ size }) => size === 'middle');
    expect(again[1].sdnr).toBeCloseTo(current.sdnr, 9);
    expect(current.detectorAirKermaAtEqualSdnr_uGy).toBeNull();
  });
});

describe('a control curve across the mix', () => {
  const rows = [
    {
      thickness_mm: 100,
      potential_kV: 70,
      tubeCurrent_mA: 300,
      exposureTime_ms: 20,
      filter: '0.3 Cu',
    },
    {
      thickness_mm: 190,
      potential_kV: 73,
      tubeCurrent_mA: 500,
      exposureTime_ms: 60,
      filter: '0.3 Cu',
    },
    {
      thickness_mm: 240,
      potential_kV: 80,
      tubeCurrent_mA: 600,
      exposureTime_ms: 80,
      filter: 'none',
    },
  ];
  const control = { curve: 'room.csv', rows };
  const curved = { ...c, techniques: [c.techniques[0], { ...c.techniques[1], control }] };
  const own = weighed(curved).evaluations.filter(({ technique }) => technique === 'Proposed');

  it('withdraws the filter in the largest patients, with a finding', () => {
    expect(own.map(({ setting }) => setting.filter)).toEqual(['0.3 Cu', '0.3 Cu', 'none']);
    expect(own[2].findings.map(({ code }) => code)).toContain('filterWithdrawn');
  });

  it('moves potential on the room’s own steps between its rows', () => {
    // 150 mm lies at 5/9 between 70 and 73 kV; the room has steps of 10 kV.
    expect(own[0].setting.potential_kV).toBe(70);
    expect(own.flatMap(({ findings }) => findings.map(({ code }) => code))).toContain(
      'potentialStep',
    );
  });

  it('splits the load as its rows do', () => {
    expect(own[2].exposure).toMatchObject({ tubeCurrent_mA: 600, exposureTime_ms: 80 });
  });
});
