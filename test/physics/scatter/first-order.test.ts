import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { firstOrder } from '../../../physics/scatter/first-order.js';
import { scatterGeometry } from '../../../physics/scatter/geometry.js';
import { firstOrderResponses } from '../../../physics/scatter/index.js';
import { nodesFor } from '../../../physics/scatter/scatter-responses.js';
import { scoreTable } from '../../../physics/scatter/scores.js';
import { linearCoefficients, slabsOf } from '../../../physics/scatter/slabs.js';
import type { Stack } from '../../../physics/stack/stack.js';
import { idealDetector, material, stackOf } from './stacks.js';

const water = material('water');
const detector = idealDetector(60);

function signalParts(stack: Stack, energy_keV: number) {
  const slabs = slabsOf(stack);
  const nodes = nodesFor(slabs, detector, null);
  const parts = firstOrder(slabs, scatterGeometry(stack), nodes, scoreTable(detector, null, nodes));
  const i = nodes.energies_keV.indexOf(energy_keV);
  return { compton: parts.compton[0][i], rayleigh: parts.rayleigh[0][i] };
}

const relative = (value: number, expected: number) => Math.abs(value / expected - 1);

describe('first-order scatter of 20 cm of water, 60 keV, 30 × 30 cm contact', () => {
  // Separately computed by photon Monte Carlo; the quadrature alone is good to 0.24 % rms.
  const parts = signalParts(stackOf([[water, 20]]), 60);

  it('is 4.1175 mean free paths thick', () => {
    const mu = linearCoefficients(water, Float64Array.of(60)).attenuation[0];
    expect(mu * 20).toBeCloseTo(4.1175, 2);
  });
  it('gives 0.6964 for one Compton scattering', () => {
    expect(relative(parts.compton, 0.6964)).toBeLessThan(0.003);
  });
  it('gives 0.2272 for one Rayleigh scattering', () => {
    expect(relative(parts.rayleigh, 0.2272)).toBeLessThan(0.003);
  });
});

describe('first-order scatter', () => {
  it('vanishes with the field', () => {
    const widths = [100, 10, 1, 0.1].map((side) => {
      const { compton, rayleigh } = signalParts(
        stackOf([[water, 20]], { field_mm: [side, side] }),
        60,
      );
      return compton + rayleigh;
    });
    for (let i = 1; i < widths.length; i++) expect(widths[i]).toBeLessThan(widths[i - 1]);
    expect(widths[3]).toBeLessThan(0.003);
  });

  it('does not change when a layer is split', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.01, max: 0.99, noNaN: true }), (share) => {
        const whole = signalParts(
          stackOf([
            [material('adipose'), 2],
            [water, 10],
          ]),
          60,
        );
        const split = signalParts(
          stackOf([
            [material('adipose'), 2],
            [water, 10 * share],
            [water, 10 * (1 - share)],
          ]),
          60,
        );
        expect(relative(split.compton, whole.compton)).toBeLessThan(1e-9);
        expect(relative(split.rayleigh, whole.rayleigh)).toBeLessThan(1e-9);
      }),
      { numRuns: 20 },
    );
  });

  it('of a cone approaches that of a parallel beam as the source recedes', () => {
    const parallel = signalParts(stackOf([[water, 20]]), 60);
    const far = signalParts(
      stackOf([[water, 20]], { beam: 'point', sourceToDetector_mm: 1e6 }),
      60,
    );
    expect(relative(far.compton, parallel.compton)).toBeLessThan(1e-3);
  });

  it('of a cone at 100 cm lies above that of a parallel beam', () => {
    const parallel = signalParts(stackOf([[water, 20]]), 60);
    const cone = signalParts(stackOf([[water, 20]], { beam: 'point' }), 60);
    expect(cone.compton / parallel.compton).toBeGreaterThan(1.03);
    expect(cone.compton / parallel.compton).toBeLessThan(1.13);
  });

  it('falls as the gap grows', () => {
    const ratios = [0, 50, 100, 200].map(
      (exitToDetector_mm) => signalParts(stackOf([[water, 20]], { exitToDetector_mm }), 60).compton,
    );
    for (let i = 1; i < ratios.length; i++) expect(ratios[i]).toBeLessThan(ratios[i - 1]);
  });

  it('is finite and positive for every score, also through iodine at its edge', () => {
    const iodine = stackOf(
      [
        [water, 10],
        [material('iodine'), 0.02],
        [water, 2],
      ],
      {
        beam: 'point',
        exitToDetector_mm: 100,
      },
    );
    const responses = firstOrderResponses(iodine, detector, {
      lookup: (_, c) => c ** 4,
      edges_keV: [88],
    });
    for (const scatter of [responses.withoutGrid, responses.behindGrid]) {
      for (const values of Object.values(scatter ?? {}) as Float64Array[]) {
        expect(values.every((value) => Number.isFinite(value) && value > 0)).toBe(true);
      }
    }
  });

  it('is smaller behind a grid that favours the normal', () => {
    const responses = firstOrderResponses(stackOf([[water, 20]]), detector, {
      lookup: (_, cosine) => 0.7 * cosine ** 8,
      edges_keV: [],
    });
    const { withoutGrid, behindGrid } = responses;
    expect(behindGrid?.signal.every((value, i) => value < withoutGrid.signal[i])).toBe(true);
  });

  it('weights air kerma by the inverse cosine, so that it exceeds the signal of an ideal detector', () => {
    const { withoutGrid } = firstOrderResponses(stackOf([[water, 20]]), detector, null);
    expect(withoutGrid.airKerma.every((value, i) => value > withoutGrid.signal[i])).toBe(true);
  });
});
