import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Case, Size } from '../../../physics/case/schema.js';
import { isAllowed } from '../../../physics/limits.js';
import { operatingPoint } from '../../../physics/operating-point.js';
import { sdnrAt } from '../../../physics/readout/index.js';
import { withAgentAmount } from '../../../physics/solve/with-agent.js';
import {
  bestSetting,
  leastAgentAmount,
  potentialForLessAgent,
  thickestPatient,
} from '../../../physics/solve.js';
import { sizesOf } from '../../../physics/stack/sizes.js';
import { settingAsSet, sweepSetting } from '../../../physics/sweep/sweep-setting.js';
import { sampleCase } from '../sample-case.js';

/** Met within 1 %, as every answer promises. */
const meets = (forward: number | null, target: number | null): void => {
  expect(target).not.toBeNull();
  expect(forward).not.toBeNull();
  expect(Math.abs((forward as number) / (target as number) - 1)).toBeLessThan(0.01);
};

const stands = (c: Case, size: Size) => {
  const point = operatingPoint(c, c.techniques[0], size);
  if (!('made' in point)) throw new Error('the case cannot be placed');
  return point;
};

/** Iodine in water, a coarse generator, quantum noise and a little of the others. */
const base = sampleCase({
  room: { tube: { potential_kV: { min: 40, max: 125, step: 5 } } },
  patient: {
    layers: [{ name: 'water', material: 'water', thickness_mm: 200 }],
    sizes: [80, 140, 200, 260].map((mm) => ({ name: `${mm} mm`, thickness_mm: mm })),
  },
  task: {
    detail: {
      agent: { name: 'iodine', amount: { value: 10, unit: 'mg element/mL' }, carrier: 'water' },
    },
  },
}).case;

interface Any {
  readonly size: Size;
  readonly potential_kV: number;
  readonly filter: string;
  readonly kerma_uGy: number;
  readonly amount: number;
}

/** Random rooms that share patient and detector, so that each size's scatter is solved once. */
const anyCase = fc.record<Any>({
  size: fc.constantFrom(...sizesOf(base.patient)),
  potential_kV: fc.integer({ min: 55, max: 120 }),
  filter: fc.constantFrom('none', '0.1 Cu', '0.3 Cu'),
  kerma_uGy: fc.double({ min: 0.2, max: 10, noNaN: true }),
  amount: fc.double({ min: 1, max: 80, noNaN: true }),
});

const caseOf = ({ potential_kV, filter, kerma_uGy, amount }: Any): Case =>
  withAgentAmount(
    {
      ...base,
      techniques: [
        {
          ...base.techniques[0],
          potential_kV,
          filter,
          control: { detectorAirKerma_uGy: kerma_uGy },
        },
      ],
    },
    amount,
  );

const hasLimit = (findings: readonly { severity: string }[]): boolean =>
  findings.some(({ severity }) => severity === 'limit');

describe('the smallest agent amount', () => {
  it('meets its target SdNR within 1 % in a forward run, or names the limit', () => {
    fc.assert(
      fc.property(anyCase, fc.double({ min: 2, max: 60, noNaN: true }), (any, target) => {
        const c = caseOf(any);
        const answer = leastAgentAmount(c, c.techniques[0], any.size, target);
        if (answer.value === null) {
          expect(hasLimit(answer.findings)).toBe(true);
          return;
        }
        meets(answer.forward, target);
        // An independent forward run, not the solver's own.
        const point = stands(withAgentAmount(c, answer.value.amount), any.size);
        meets(sdnrAt(point.made.readout, point.tubeLoad_mAs), target);
      }),
      { numRuns: 25 },
    );
  });

  it('is never more than can be delivered', () => {
    const agentsCompared: Case['agentsCompared'] = [
      {
        ...(base.task.detail.agent as NonNullable<Case['task']['detail']['agent']>),
        toxicityFactor: null,
        deliverable_mg_per_mL: 2,
        source: 'invented',
      },
    ];
    const c = { ...base, agentsCompared };
    const size = sizesOf(c.patient)[2];
    const answer = leastAgentAmount(c, c.techniques[0], size, 150);
    expect(answer.value).toBeNull();
    expect(answer.findings[0]).toMatchObject({ code: 'agentAmount', bound: 2 });
  });

  it('is none where the carrier alone shows the detail', () => {
    const detail = { ...base.task.detail, reference: 'adipose' };
    const c = { ...base, task: { ...base.task, detail } };
    const answer = leastAgentAmount(c, c.techniques[0], sizesOf(c.patient)[0], 1);
    expect(answer.value?.amount).toBe(0);
    expect(answer.findings[0].code).toBe('agentNotNeeded');
  });
});

describe('the potential for less iodine', () => {
  it('keeps SdNR at the same incident air kerma within 1 %, on an allowed step of the room', () => {
    let answered = 0;
    fc.assert(
      fc.property(anyCase, fc.double({ min: 0.6, max: 0.99, noNaN: true }), (any, share) => {
        const c = caseOf(any);
        const answer = potentialForLessAgent(c, c.techniques[0], any.size, share);
        if (answer.value === null) {
          expect(hasLimit(answer.findings)).toBe(true);
          return;
        }
        answered++;
        const full = stands(c, any.size);
        const target = sdnrAt(full.made.readout, full.tubeLoad_mAs);
        meets(answer.forward, target);
        // Forward again, by hand: less iodine, that potential, the same incident air kerma.
        const { potential_kV, roomPotential_kV, roomSdnr } = answer.value;
        const less = withAgentAmount(c, share * (c.task.detail.agent?.amount.value ?? 0));
        const held = { ...stands(less, any.size), tubeLoad_mAs: full.tubeLoad_mAs };
        const at = (kV: number) =>
          sweepSetting(
            less,
            held,
            { potential_kV: kV, filter: any.filter, grid: 'in' },
            'incidentAirKerma',
          );
        meets(at(potential_kV).values?.sdnr ?? null, target);
        const room = at(roomPotential_kV);
        expect(isAllowed(room.findings)).toBe(true);
        expect(room.values?.sdnr).toBeCloseTo(roomSdnr, 9);
        expect(roomSdnr).toBeGreaterThanOrEqual(target);
      }),
      { numRuns: 25 },
    );
    expect(answered).toBeGreaterThan(0);
  });

  it('names the limits of the nearest potential that would do, where the room forbids them all', () => {
    const c = caseOf({
      size: sizesOf(base.patient)[2],
      potential_kV: 80,
      filter: 'none',
      kerma_uGy: 2.5,
      amount: 10,
    });
    const tube = { ...c.room.tube, power_kW: 0.1 };
    const weak = { ...c, room: { ...c.room, tube } };
    const answer = potentialForLessAgent(weak, weak.techniques[0], sizesOf(weak.patient)[2], 0.97);
    expect(answer.value).toBeNull();
    expect(answer.findings.map(({ code }) => code)).toContain('power');
  });
});

describe('the thickest patient', () => {
  const kept = { ...base, patient: { ...base.patient, sizes: [] } };

  it('meets the target, and half a millimetre more does not', () => {
    const target = 150;
    const answer = thickestPatient(kept, kept.techniques[0], target, 220, 300);
    const thickness_mm = answer.value?.thickness_mm ?? Number.NaN;
    meets(answer.forward, target);
    expect(answer.findings[0].code).toBe('sdnrShort');
    const thicker = stands(kept, { name: 'thicker', thickness_mm: thickness_mm + 0.5, weight: 1 });
    expect(sdnrAt(thicker.made.readout, thicker.tubeLoad_mAs)).toBeLessThan(target);
  });

  it('stops at the limit that a thicker patient would break, and names it', () => {
    const tube = { ...kept.room.tube, power_kW: 20 };
    const weak = { ...kept, room: { ...kept.room, tube } };
    const answer = thickestPatient(weak, weak.techniques[0], 5, 240, 320);
    expect(answer.forward).toBeGreaterThan(5);
    expect(answer.findings.map(({ code }) => code)).toEqual(['power']);
    const size = { name: 'answer', thickness_mm: answer.value?.thickness_mm ?? 0, weight: 1 };
    expect(isAllowed(settingAsSet(weak, stands(weak, size)).findings)).toBe(true);
  });
});

describe('the best setting', () => {
  it('is allowed, meets its figure of merit in a forward run, and no allowed setting beats it', () => {
    const cost = fc.constantFrom('incidentAirKerma', 'energyImparted', 'tubeLoad' as const);
    fc.assert(
      fc.property(anyCase, cost, fc.constantFrom('sdnr', 'tubeLoad' as const), (any, by, hold) => {
        const c = caseOf(any);
        const answer = bestSetting(c, any.size, by, hold);
        if (answer.value === null) {
          expect(hasLimit(answer.findings)).toBe(true);
          return;
        }
        meets(answer.forward, answer.target);
        expect(isAllowed(answer.findings)).toBe(true);
        const { setting, figureOfMerit, window90_kV } = answer.value;
        expect(setting.potential_kV).toBeGreaterThanOrEqual(window90_kV[0]);
        expect(setting.potential_kV).toBeLessThanOrEqual(window90_kV[1]);
        const point = stands(c, any.size);
        for (const { name: filter } of c.room.filters) {
          const other = sweepSetting(c, point, { ...setting, filter }, hold);
          if (!other.values || !isAllowed(other.findings)) continue;
          const dose = {
            incidentAirKerma: other.values.incidentAirKerma_mGy,
            energyImparted: other.values.energyImparted_mJ ?? Number.NaN,
            tubeLoad: other.values.tubeLoad_mAs,
          }[by];
          expect(other.values.sdnr ** 2 / dose).toBeLessThanOrEqual(figureOfMerit * (1 + 1e-9));
        }
      }),
      { numRuns: 12 },
    );
  });

  it('names the limit when nothing is allowed', () => {
    const c = { ...base, room: { ...base.room, tube: { ...base.room.tube, power_kW: 0.001 } } };
    const answer = bestSetting(c, sizesOf(c.patient)[2], 'incidentAirKerma', 'sdnr');
    expect(answer.value).toBeNull();
    expect(answer.findings.map(({ code }) => code)).toContain('power');
  });
});
