import { describe, expect, it } from 'vitest';
import type { Case, Technique } from '../../../physics/case/schema.js';
import { powerAvailable_kW } from '../../../physics/exposure.js';
import { framesPerRun } from '../../../physics/frames.js';
import type { Evaluation, Finding } from '../../../physics/results.js';
import { weigh } from '../../../physics/weigh.js';
import { sampleCase } from '../sample-case.js';

const base = sampleCase({ room: { tube: { potential_kV: { min: 50, max: 120, step: 5 } } } }).case;

/** The sample with parts of tube, detector and Current replaced; scatter is solved once for all. */
const caseWith = (parts: {
  tube?: Partial<Case['room']['tube']>;
  room?: Partial<Case['room']>;
  task?: Partial<Case['task']>;
  current?: Partial<Technique>;
  agentsCompared?: Case['agentsCompared'];
}): Case => ({
  ...base,
  room: { ...base.room, ...parts.room, tube: { ...base.room.tube, ...parts.tube } },
  task: { ...base.task, ...parts.task },
  techniques: [{ ...base.techniques[0], ...parts.current }],
  agentsCompared: parts.agentsCompared ?? [],
});

const current = (c: Case): Evaluation => weigh({ case: c, assumed: [] }).evaluations[0];

const found = (evaluation: Evaluation, code: string): Finding => {
  const finding = evaluation.findings.find((one) => one.code === code);
  if (!finding) throw new Error(`no ${code} in ${evaluation.findings.map((f) => f.code)}`);
  return finding;
};

/** The setting a finding offers, as the technique it would make. */
const offered = (finding: Finding): Pick<Technique, 'potential_kV' | 'filter'> => {
  const [, potential, filter] = /^(\d+) kV, (.+)$/.exec(finding.nearest ?? '') ?? [];
  return { potential_kV: Number(potential), filter: filter === 'no filter' ? 'none' : filter };
};

const acquisition = { ...base.techniques[0].acquisition };
const run = { ...acquisition, mode: 'fluoroscopy', frames: 100, frameRate_per_s: 15 } as const;
const at80ms = { ...acquisition, fixed: { exposureTime_ms: 80 } };

describe('every limit names its value, its bound and the nearest setting allowed', () => {
  const exposure = (e: Evaluation) => e.exposure;
  const cases: readonly [
    code: string,
    c: Case,
    value: (e: Evaluation) => number | null,
    bound: (e: Evaluation) => number | null,
  ][] = [
    [
      'power',
      caseWith({ tube: { power_kW: 4 }, current: { acquisition: at80ms } }),
      (e) => exposure(e).power_kW,
      () => 4,
    ],
    [
      'power',
      caseWith({
        tube: {
          rating: [
            { exposureTime_ms: 10, power_kW: 60 },
            { exposureTime_ms: 100, power_kW: 2 },
          ],
        },
        current: { acquisition: at80ms },
      }),
      (e) => exposure(e).power_kW,
      () => 60 + (2 - 60) * (Math.log(8) / Math.log(10)),
    ],
    [
      'tubeCurrent',
      caseWith({ tube: { current_mA: { min: 10, max: 50 } }, current: { acquisition: at80ms } }),
      (e) => exposure(e).tubeCurrent_mA,
      () => 50,
    ],
    [
      'tubeCurrentFloor',
      caseWith({ tube: { current_mA: { min: 150, max: 1000 } }, current: { acquisition: at80ms } }),
      (e) => exposure(e).tubeCurrent_mA,
      () => 150,
    ],
    [
      'exposureTime',
      caseWith({
        tube: { exposureTime_ms: { min: 1, max: 60 } },
        current: { acquisition: { ...acquisition, fixed: { tubeCurrent_mA: 90 } } },
      }),
      (e) => exposure(e).exposureTime_ms,
      () => 60,
    ],
    [
      'exposureTimeFloor',
      caseWith({
        tube: { exposureTime_ms: { min: 20, max: 200 } },
        current: { acquisition: { ...acquisition, fixed: { tubeCurrent_mA: 500 } } },
      }),
      (e) => exposure(e).exposureTime_ms,
      () => 20,
    ],
    [
      'heatPerRun',
      caseWith({ tube: { heatPerRun_kJ: 50 }, current: { acquisition: run } }),
      (e) => (80 * e.exposure.tubeLoad_mAs * framesPerRun(run)) / 1000,
      () => 50,
    ],
    [
      'motion',
      caseWith({
        task: { motion_mm_per_s: 100 },
        tube: { exposureTime_ms: { min: 1, max: 500 } },
        current: { acquisition: { ...acquisition, fixed: { tubeCurrent_mA: 90 } } },
      }),
      (e) => exposure(e).exposureTime_ms,
      () => 50,
    ],
    [
      'minimumHvl',
      caseWith({
        room: {
          rules: [
            {
              kind: 'minimum-hvl',
              segments: [
                {
                  from_kV: 50,
                  to_kV: 120,
                  points: [
                    [50, 3],
                    [120, 3],
                  ],
                },
              ],
              source: 'invented',
              date: '',
              provenance: 'entered',
            },
          ],
        },
      }),
      (e) => e.beam.halfValueLayers[0].first_mm,
      () => 3,
    ],
    [
      'kermaRate',
      caseWith({
        room: {
          rules: [
            {
              kind: 'kerma-rate',
              limit_mGy_per_min: 600,
              appliesTo: ['fluoroscopy'],
              source: 'invented',
              date: '',
              provenance: 'entered',
            },
          ],
        },
        current: { acquisition: run },
      }),
      (e) => e.dose.incidentAirKermaRate_mGy_per_min,
      () => 600,
    ],
  ];

  it.each(cases)('%s', (code, c, value, bound) => {
    const evaluation = current(c);
    const finding = found(evaluation, code);
    expect(finding.severity).toBe('limit');
    expect(finding.value).toBeCloseTo(value(evaluation) ?? Number.NaN, 9);
    expect(finding.bound).toBeCloseTo(bound(evaluation) ?? Number.NaN, 9);
    expect(finding.message).toMatch(/Nearest allowed under this control: \d+ kV, /);
    const again = current(
      caseWith({
        room: c.room,
        tube: c.room.tube,
        task: c.task,
        current: { ...c.techniques[0], ...offered(finding) },
      }),
    );
    expect(again.findings.filter(({ severity }) => severity === 'limit')).toEqual([]);
  });

  it('knows no power above the rating chart at the exposure time', () => {
    const tube = { ...base.room.tube, rating: [{ exposureTime_ms: 10, power_kW: 20 }] };
    expect(powerAvailable_kW(tube, 80)).toBe(20);
  });

  it.each([
    [130, 'potentialRange', 120, '120 kV, no filter'],
    [72, 'potentialStep', 5, '70 kV, no filter'],
  ])('%d kV: %s', (potential_kV, code, bound, nearest) => {
    const finding = found(current(caseWith({ current: { potential_kV } })), code);
    expect(finding).toMatchObject({ value: potential_kV, bound, nearest });
  });

  it.each([
    ['detectorFloor', { min: 5, max: 50 }, 5],
    ['detectorCeiling', { min: 0.01, max: 1 }, 1],
  ])(
    '%s: no setting helps while the control holds that kerma, and the finding says so',
    (code, airKerma_uGy, bound) => {
      const c = caseWith({ room: { detector: { ...base.room.detector, airKerma_uGy } } });
      const finding = found(current(c), code);
      expect(finding.value).toBeCloseTo(2.5, 9);
      expect(finding.bound).toBe(bound);
      expect(finding.message).toContain('No setting of this room is allowed');
    },
  );

  it('detectorFloor under a fixed tube load: a harder beam helps', () => {
    const airKerma_uGy = { min: 2.6, max: 50 };
    const detector = { ...base.room.detector, airKerma_uGy };
    const { exposure: made } = current(base);
    const control = { tubeLoad_mAs: made.tubeLoad_mAs };
    const finding = found(
      current(caseWith({ room: { detector }, current: { control } })),
      'detectorFloor',
    );
    expect(finding.nearest).toBe('85 kV, no filter');
  });

  it('the skin too near: how far the focal spot must go, since no setting helps', () => {
    const geometry = { ...base.room.geometry, minSourceToSkin_mm: 850 };
    const finding = found(current(caseWith({ room: { geometry } })), 'sourceToSkin');
    expect(finding).toMatchObject({ value: 800, bound: 850 });
    expect(finding.nearest).toBe('focal spot 50 mm further away');
  });

  it('more agent than can be delivered: the amount that can, since no setting helps', () => {
    const agentsCompared: Case['agentsCompared'] = [
      {
        name: 'iodine',
        amount: { value: 10, unit: 'mg element/mL' },
        carrier: null,
        toxicityFactor: null,
        deliverable_mg_per_mL: 8,
        source: 'invented',
      },
    ];
    const finding = found(current(caseWith({ agentsCompared })), 'agentAmount');
    expect(finding.value).toBeCloseTo(10, 9);
    expect(finding).toMatchObject({ bound: 8, nearest: '8 mg element/mL' });
  });

  it('tells value and bound apart however near they are', () => {
    const { exposure: made } = current(caseWith({ current: { acquisition: at80ms } }));
    const power_kW = (made.power_kW ?? 0) / 1.0004;
    const tight = caseWith({ tube: { power_kW }, current: { acquisition: at80ms } });
    const [, value, bound] =
      /Needs ([\d.]+) kW .* has ([\d.]+) kW/.exec(found(current(tight), 'power').message) ?? [];
    expect(Number(value)).toBeGreaterThan(Number(bound));
  });
});

describe('a rule that is only recalled', () => {
  it('is never met: kerma rate below the bound asks to confirm the text', () => {
    const c = caseWith({
      room: {
        rules: [
          {
            kind: 'kerma-rate',
            limit_mGy_per_min: 1e5,
            appliesTo: ['fluoroscopy'],
            source: 'recalled text',
            date: '',
            provenance: 'recalled',
          },
        ],
      },
      current: { acquisition: run },
    });
    const finding = found(current(c), 'ruleUnconfirmed');
    expect(finding.severity).toBe('note');
    expect(finding.message).toContain('confirm the text, and measure');
  });
});

describe('a technique that follows a control curve', () => {
  it('is offered the nearest setting at the same detector air kerma', () => {
    const rows = [
      {
        thickness_mm: 200,
        potential_kV: 80,
        tubeCurrent_mA: 200,
        exposureTime_ms: 80,
        filter: 'none',
      },
    ];
    const c = caseWith({
      tube: { power_kW: 15 },
      current: { control: { curve: 'room.csv', rows } },
    });
    const finding = found(current(c), 'power');
    expect(finding.message).toMatch(/Nearest allowed at the same detector air kerma: \d+ kV/);
  });
});
