import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { HoldConstant } from '../../physics/results.js';
import { weigh } from '../../physics/weigh.js';
import { sampleCase, sampleJson } from './sample-case.js';

const quiet = {
  detector: { structureNoise_fraction: 0, electronicNoiseKerma_uGy: 0 },
};
const answer = weigh(sampleCase());
const [current, proposed] = answer.evaluations;
const rowOf = (hold: HoldConstant, from = answer) => {
  const row = from.comparisons[0].rows.find(({ holdConstant }) => holdConstant === hold);
  if (!row) throw new Error(`no row ${hold}`);
  return row;
};

/** Every number of a JSON value, with its path. */
const numbers = (value: unknown, path = ''): [string, number][] =>
  typeof value === 'number'
    ? [[path, value]]
    : value && typeof value === 'object'
      ? Object.entries(value).flatMap(([key, part]) => numbers(part, `${path}.${key}`))
      : [];

describe('weighing a case', () => {
  it('delivers the detector air kerma that the control asks for', () => {
    for (const { detector } of [current, proposed]) {
      expect(detector.airKerma_uGy).toBeCloseTo(2.5, 10);
    }
  });

  it('holds no number that is not finite', () => {
    const bad = numbers(answer).filter(([, value]) => !Number.isFinite(value));
    expect(bad).toEqual([]);
  });

  it('clones to a worker unchanged', () => {
    expect(structuredClone(answer)).toEqual(answer);
  });

  it('gives the same answer twice, to the last bit', () => {
    expect(JSON.stringify(weigh(sampleCase()))).toBe(JSON.stringify(answer));
  });

  it('makes the held quantity of each equality equal', () => {
    expect(rowOf('sdnr').ratio.sdnr).toBeCloseTo(1, 10);
    expect(rowOf('incidentAirKerma').ratio.incidentAirKerma).toBeCloseTo(1, 10);
    expect(rowOf('tubeLoad').ratio.tubeLoad).toBeCloseTo(1, 12);
  });

  it('shows that heavy copper at equal detector air kerma hides a loss of SdNR', () => {
    const heavy = weigh(
      sampleCase({
        room: quiet,
        techniques: [
          { ...sampleJson.techniques[0], potential_kV: 70 },
          { ...sampleJson.techniques[1], potential_kV: 70, filter: '0.9 Cu' },
        ],
      }),
    );
    const row = rowOf('detectorAirKerma', heavy);
    expect(row.ratio.sdnr).toBeLessThan(0.9);
    expect(row.ratio.sdnr).toBeGreaterThan(0.7);
    const told = heavy.comparisons[0].rows.flatMap(({ findings }) => findings);
    expect(told.map(({ code }) => code)).toEqual(['sdnrLost']);
    expect(row.ratio.incidentAirKerma).toBeLessThan(
      rowOf('sdnr', heavy).ratio.incidentAirKerma ?? 0,
    );
  });

  it('has dose ratios at equal SdNR equal to figure-of-merit ratios when quantum-limited', () => {
    const limited = weigh(sampleCase({ room: quiet }));
    const [a, b] = limited.evaluations;
    expect(rowOf('sdnr', limited).ratio.incidentAirKerma).toBeCloseTo(
      (a.figureOfMerit.perIncidentAirKerma_per_mGy ?? 0) /
        (b.figureOfMerit.perIncidentAirKerma_per_mGy ?? 0),
      10,
    );
  });

  it('relates SdNR to detected contrast over total relative noise', () => {
    for (const { sdnr, contrast, noise } of [current, proposed]) {
      expect(sdnr).toBeCloseTo(Math.abs(contrast.detected) / noise.total, 8);
    }
  });

  it('keeps the kerma–area product independent of the reference distance in vacuum', () => {
    const product = (referencePoint_mm: number): number =>
      weigh(sampleCase({ room: { geometry: { air: false, referencePoint_mm } } })).evaluations[0]
        .dose.kermaAreaProduct_Gycm2;
    expect(product(500)).toBeCloseTo(product(900), 12);
  });

  it('counts mask frames in the totals of a run', () => {
    const acquisition = { mode: 'subtraction', frames: 12, maskFrames: 2, frameRate_per_s: 3 };
    const run = weigh(
      sampleCase({ techniques: sampleJson.techniques.map((t) => ({ ...t, acquisition })) }),
    ).evaluations[0].dose;
    expect(run.perRun.incidentAirKerma_mGy).toBeCloseTo(14 * run.incidentAirKerma_mGy, 12);
    expect(run.incidentAirKermaRate_mGy_per_min).toBeCloseTo(180 * run.incidentAirKerma_mGy, 10);
  });

  it('scales every kerma with the load and no ratio with it', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.1, max: 20, noNaN: true }), (kerma_uGy) => {
        const control = { detectorAirKerma_uGy: kerma_uGy };
        const other = weigh(
          sampleCase({
            room: quiet,
            techniques: sampleJson.techniques.map((t) => ({ ...t, control })),
          }),
        );
        const [a] = other.evaluations;
        expect(a.dose.incidentAirKerma_mGy / current.dose.incidentAirKerma_mGy).toBeCloseTo(
          kerma_uGy / 2.5,
          8,
        );
        expect(a.scatter.spr).toBeCloseTo(current.scatter.spr, 10);
        expect(a.contrast.subject).toBeCloseTo(current.contrast.subject, 10);
      }),
      { numRuns: 4 },
    );
  });

  it('warns when static noise turns a saving into a loss at equal SdNR', () => {
    const heavy = weigh(
      sampleCase({
        room: { detector: { structureNoise_fraction: 0.007 } },
        techniques: [
          { ...sampleJson.techniques[0], potential_kV: 70 },
          { ...sampleJson.techniques[1], potential_kV: 70, filter: '0.9 Cu' },
        ],
      }),
    );
    const codes = heavy.comparisons[0].rows.flatMap(({ findings }) =>
      findings.map(({ code }) => code),
    );
    expect(codes).toContain('equalitiesDisagree');
    expect(codes).not.toContain('sdnrLost');
    const atEqualSdnr = rowOf('sdnr', heavy).ratio.incidentAirKerma;
    expect(atEqualSdnr === null || atEqualSdnr > 1).toBe(true);
  });

  it('names what forbids a technique', () => {
    const short = weigh(sampleCase({ room: { tube: { power_kW: 1 } } }));
    expect(short.evaluations[1].findings.map(({ code }) => code)).toContain('power');
  });

  it('says when a size cannot be placed, and still answers for the others', () => {
    const sizes = [
      { name: 'fits', thickness_mm: 200 },
      { name: 'too thick', thickness_mm: 1100 },
    ];
    const mixed = weigh(sampleCase({ patient: { sizes } }));
    expect(mixed.evaluations.map(({ size }) => size)).toEqual(['fits', 'fits']);
    expect(mixed.findings.some(({ severity }) => severity === 'limit')).toBe(true);
  });
});

describe('what a reader must be told', () => {
  it('says when the detail is below the Rose threshold', () => {
    const faint = weigh(
      sampleCase({
        task: { roseThreshold: 100 },
        techniques: [{ ...sampleJson.techniques[0], control: { detectorAirKerma_uGy: 0.02 } }],
      }),
    );
    expect(faint.evaluations[0].findings.map(({ code }) => code)).toContain('belowRose');
  });

  it('says when blur is no longer small against the detail, and shows it in mm', () => {
    const [sharp] = answer.evaluations;
    expect(sharp.findings.map(({ code }) => code)).not.toContain('blurNotInSdnr');
    const blurred = weigh(sampleCase({ room: { detector: { pixel_mm: 5 } } })).evaluations[0];
    expect(blurred.findings.map(({ code }) => code)).toContain('blurNotInSdnr');
    const { focalSpot_mm, pixel_mm, motion_mm, total_mm } = blurred.unsharpness;
    expect(total_mm).toBeCloseTo(Math.hypot(focalSpot_mm, pixel_mm, motion_mm), 12);
    expect(motion_mm).toBe(0);
  });

  it('says which rules are not entered and which entries are not used', () => {
    const codes = answer.findings.map(({ code }) => code);
    expect(codes).toContain('noRuleEntered');
    expect(codes).not.toContain('enteredNotUsed');
    const told = weigh(
      sampleCase({
        measuredChecks: [{ quantity: 'sdnr', technique: 'Current', values: [1] }],
      }),
    ).findings.filter(({ code }) => code === 'enteredNotUsed');
    expect(told.map(({ path }) => path)).toEqual(['measuredChecks']);
  });
});
