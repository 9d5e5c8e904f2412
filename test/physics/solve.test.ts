import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { operatingPoint } from '../../physics/operating-point.js';
import { sdnrAt } from '../../physics/readout/index.js';
import { withAgentAmount } from '../../physics/solve/with-agent.js';
import {
  bestSetting,
  leastAgentAmount,
  potentialForLessAgent,
  thickestPatient,
} from '../../physics/solve.js';
import { sampleCase } from './sample-case.js';

/** Met within 1 %, as every answer promises. */
const meets = (forward: number | null, target: number | null): void => {
  expect(target).not.toBeNull();
  expect(forward).not.toBeNull();
  expect(Math.abs((forward as number) / (target as number) - 1)).toBeLessThan(0.01);
};

const quiet = { structureNoise_fraction: 0, electronicNoiseKerma_uGy: 0 };
const water = {
  agent: { name: 'iodine', amount: { value: 10, unit: 'mg element/mL' }, carrier: 'water' },
};
const anyRoom = fc.record({
  potential_kV: fc.integer({ min: 55, max: 120 }),
  thickness_mm: fc.integer({ min: 80, max: 260 }),
  kerma_uGy: fc.double({ min: 0.2, max: 10, noNaN: true }),
  amount: fc.double({ min: 1, max: 80, noNaN: true }),
});

const caseOf = (room: {
  potential_kV: number;
  thickness_mm: number;
  kerma_uGy: number;
  amount: number;
}) => {
  const technique = {
    name: 'Current',
    potential_kV: room.potential_kV,
    control: { detectorAirKerma_uGy: room.kerma_uGy },
  };
  return sampleCase({
    room: { detector: quiet },
    patient: { layers: [{ name: 'water', material: 'water', thickness_mm: room.thickness_mm }] },
    task: {
      detail: {
        ...water,
        agent: { ...water.agent, amount: { value: room.amount, unit: 'mg element/mL' } },
      },
    },
    techniques: [technique],
  }).case;
};

describe('solving', () => {
  it('finds the smallest agent amount, and a forward run meets the target within 1 %', () => {
    fc.assert(
      fc.property(anyRoom, fc.double({ min: 3, max: 30, noNaN: true }), (room, target) => {
        const c = caseOf(room);
        const size = { name: 'one', thickness_mm: room.thickness_mm, weight: 1 };
        const answer = leastAgentAmount(c, c.techniques[0], size, target);
        if (answer.value === null) {
          expect(answer.findings.some(({ severity }) => severity === 'limit')).toBe(true);
          return;
        }
        meets(answer.forward, answer.target);
        // An independent forward run, not the solver's own.
        const point = operatingPoint(
          withAgentAmount(c, answer.value.amount),
          c.techniques[0],
          size,
        );
        if (!('made' in point)) throw new Error('the answer cannot be placed');
        meets(sdnrAt(point.made.readout, point.tubeLoad_mAs), target);
      }),
      { numRuns: 8 },
    );
  });

  it('finds a potential for less iodine that keeps SdNR at equal incident air kerma, or names the limit', () => {
    fc.assert(
      fc.property(anyRoom, fc.double({ min: 0.7, max: 0.98, noNaN: true }), (room, share) => {
        const c = caseOf(room);
        const size = { name: 'one', thickness_mm: room.thickness_mm, weight: 1 };
        const answer = potentialForLessAgent(c, c.techniques[0], size, share);
        if (answer.value === null) {
          expect(answer.findings.map(({ code }) => code)).toContain('potentialRange');
        } else {
          meets(answer.forward, answer.target);
          expect(answer.value.potential_kV).toBeLessThanOrEqual(room.potential_kV);
        }
      }),
      { numRuns: 6 },
    );
  });

  it('finds the thickest patient that meets the target under every limit', () => {
    const c = caseOf({ potential_kV: 80, thickness_mm: 200, kerma_uGy: 2.5, amount: 10 });
    const answer = thickestPatient(c, c.techniques[0], 20, 150, 400);
    expect(answer.value).not.toBeNull();
    expect(answer.forward).toBeGreaterThanOrEqual(20);
    expect(answer.findings.length).toBeGreaterThan(0);
  });

  it('finds a best setting that nothing forbids and that no other potential of its filter beats', () => {
    const c = caseOf({ potential_kV: 80, thickness_mm: 200, kerma_uGy: 2.5, amount: 10 });
    const size = { name: 'one', thickness_mm: 200, weight: 1 };
    const answer = bestSetting(c, size, 'incidentAirKerma', 'sdnr');
    meets(answer.forward, answer.target);
    const [low, high] = answer.value?.window90_kV ?? [0, 0];
    expect(answer.value?.setting.potential_kV).toBeGreaterThanOrEqual(low);
    expect(answer.value?.setting.potential_kV).toBeLessThanOrEqual(high);
  });

  it('names the limit when nothing is allowed', () => {
    const parsed = caseOf({ potential_kV: 80, thickness_mm: 200, kerma_uGy: 2.5, amount: 10 });
    const c = {
      ...parsed,
      room: { ...parsed.room, tube: { ...parsed.room.tube, power_kW: 0.001 } },
    };
    const size = { name: 'one', thickness_mm: 200, weight: 1 };
    const answer = bestSetting(c, size, 'incidentAirKerma', 'sdnr');
    expect(answer.value).toBeNull();
    expect(answer.findings.map(({ code }) => code)).toContain('power');
  });
});
