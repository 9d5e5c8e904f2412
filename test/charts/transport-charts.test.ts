import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  type ConvergenceData,
  convergenceScales,
  convergenceWords,
} from '../../components/charts/transport-convergence.js';
import { differencePosition } from '../../components/charts/transport-difference.js';

const frame = { width: 360, height: 232 };
const data: ConvergenceData = {
  quantity: 'Scatter to primary, behind grid',
  unit: '',
  technique: 'Current',
  ink: 0,
  size: 'median',
  estimate: 0.62,
  tolerance_percent: 13,
  points: [25_000, 100_000, 400_000].map((photons) => ({
    photons,
    value: 0.61,
    standardError: 0.1 / Math.sqrt(photons / 25_000),
  })),
  ofPhotons: 1_000_000,
};

describe('the chart of a run', () => {
  it('gives equal room to equal factors of photons, up to all asked for', () => {
    const { x } = convergenceScales(data, frame);
    expect(x(100_000) - x(50_000)).toBeCloseTo(x(800_000) - x(400_000), 9);
    expect(x(25_000)).toBe(46);
    expect(x(1_000_000)).toBe(348);
  });

  it('holds the stated band and the last standard errors', () => {
    const { y } = convergenceScales(data, frame);
    for (const value of [0.62 * 0.87, 0.62 * 1.13, 0.61 - 0.075, 0.61 + 0.075]) {
      expect(y(value)).toBeGreaterThan(0);
      expect(y(value)).toBeLessThan(frame.height - 38);
    }
  });

  it('stands with nothing flown, with one point, and without an estimate', () => {
    for (const points of [[], data.points.slice(0, 1)]) {
      for (const estimate of [null, 0.62]) {
        const { x, y } = convergenceScales({ ...data, points, estimate }, frame);
        expect(Number.isFinite(x(500_000))).toBe(true);
        expect(Number.isFinite(y(0.6))).toBe(true);
      }
    }
  });

  it('is told in words', () => {
    expect(convergenceWords(data)).toBe(
      'Scatter to primary, behind grid, Current, size median: estimate 0.6200, stated within 13 %; transport 0.6100, standard error 0.025, after 400000 of 1000000 photons.',
    );
    expect(convergenceWords({ ...data, points: [], estimate: null })).toBe(
      'Scatter to primary, behind grid, Current, size median: no estimate; nothing flown yet.',
    );
  });
});

describe('the bar of a difference', () => {
  it('has no difference in its middle, and every difference on it', () => {
    expect(differencePosition(0, 10)).toBe(55);
    const percent = fc.double({ min: -1e4, max: 1e4, noNaN: true });
    fc.assert(
      fc.property(
        percent,
        fc.double({ min: 0.1, max: 20, noNaN: true }),
        (difference, tolerance) => {
          const x = differencePosition(difference, tolerance);
          expect(x).toBeGreaterThanOrEqual(5);
          expect(x).toBeLessThanOrEqual(105);
        },
      ),
    );
  });

  it('sets a difference at the tolerance at the same place whatever the tolerance', () => {
    expect(differencePosition(3, 3)).toBeCloseTo(differencePosition(10, 10), 12);
    expect(differencePosition(3, 3)).toBeGreaterThan(differencePosition(2, 3));
  });
});
