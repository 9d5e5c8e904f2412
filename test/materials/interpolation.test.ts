import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  evaluate,
  type HermiteCurve,
  monotoneCubic,
  naturalSpline,
} from '../../materials/index.js';

/** Ascending x from positive steps, with any y. */
const nodes = fc
  .array(
    fc.tuple(
      fc.double({ min: 0.01, max: 5, noNaN: true }),
      fc.double({ min: -10, max: 10, noNaN: true }),
    ),
    { minLength: 2, maxLength: 12 },
  )
  .map((steps) => {
    let at = 0;
    const x = Float64Array.from(steps, ([step]) => {
      at += step;
      return at;
    });
    return { x, y: Float64Array.from(steps, ([, y]) => y) };
  });

const secondDerivativeAt = ({ x, y, slope }: HermiteCurve, i: number, side: 'left' | 'right') => {
  const [from, to] = side === 'left' ? [i - 1, i] : [i, i + 1];
  const h = x[to] - x[from];
  const rise = (6 * (y[to] - y[from])) / (h * h);
  return side === 'left'
    ? -rise + (2 * slope[from] + 4 * slope[to]) / h
    : rise - (4 * slope[from] + 2 * slope[to]) / h;
};

describe('both curves', () => {
  test.each([naturalSpline, monotoneCubic])('pass through their nodes (%o)', (build) => {
    fc.assert(
      fc.property(nodes, ({ x, y }) => {
        const curve = build(x, y);
        x.forEach((at, i) => {
          expect(evaluate(curve, at)).toBeCloseTo(y[i], 9);
        });
      }),
    );
  });

  test.each([naturalSpline, monotoneCubic])('repeat a straight line exactly (%o)', (build) => {
    fc.assert(
      fc.property(nodes, fc.double({ min: -0.5, max: 1.5, noNaN: true }), ({ x }, share) => {
        const line = (at: number) => 2 - 3 * at;
        const at = x[0] + share * (x[x.length - 1] - x[0]);
        expect(evaluate(build(x, x.map(line)), at)).toBeCloseTo(line(at), 8);
      }),
    );
  });
});

describe('the natural spline', () => {
  test('has a continuous second derivative that is zero at the ends', () => {
    fc.assert(
      fc.property(nodes, ({ x, y }) => {
        const curve = naturalSpline(x, y);
        const last = x.length - 1;
        const scale = Math.max(...y.map(Math.abs), 1) / Math.min(...steps(x)) ** 2;
        expect(Math.abs(secondDerivativeAt(curve, 0, 'right')) / scale).toBeLessThan(1e-9);
        expect(Math.abs(secondDerivativeAt(curve, last, 'left')) / scale).toBeLessThan(1e-9);
        for (let i = 1; i < last; i++) {
          const jump = secondDerivativeAt(curve, i, 'right') - secondDerivativeAt(curve, i, 'left');
          expect(Math.abs(jump) / scale).toBeLessThan(1e-9);
        }
      }),
    );
  });
});

describe('the monotone cubic', () => {
  test('stays between its neighbouring nodes', () => {
    fc.assert(
      fc.property(nodes, fc.double({ min: 0, max: 1, noNaN: true }), ({ x, y }, share) => {
        const curve = monotoneCubic(x, y);
        for (let i = 0; i + 1 < x.length; i++) {
          const value = evaluate(curve, x[i] + share * (x[i + 1] - x[i]));
          expect(value).toBeGreaterThanOrEqual(Math.min(y[i], y[i + 1]) - 1e-9);
          expect(value).toBeLessThanOrEqual(Math.max(y[i], y[i + 1]) + 1e-9);
        }
      }),
    );
  });

  test('jumps at a node given twice: the later row holds at the node, the earlier just below', () => {
    const curve = monotoneCubic(
      Float64Array.of(0, 1, 2, 2, 3, 4),
      Float64Array.of(3, 2, 1, 9, 8, 7),
    );
    expect(evaluate(curve, 2)).toBe(9);
    expect(evaluate(curve, 2 - 1e-12)).toBeCloseTo(1, 9);
    expect(evaluate(curve, 1.5)).toBeCloseTo(1.5, 12);
    expect(evaluate(curve, 2.5)).toBeCloseTo(8.5, 12);
  });

  test('does not let a rounding step beside a jump bend the next, long interval', () => {
    const straight = (at: number) => -2.7 * at;
    const x = Float64Array.of(0, 0.01, 0.3, 0.5, 0.7);
    const y = x.map(straight);
    y[0] += 0.005;
    const curve = monotoneCubic(x, y);
    for (const at of [0.05, 0.1, 0.15, 0.2, 0.25]) {
      expect(evaluate(curve, at)).toBeCloseTo(straight(at), 9);
    }
  });
});

function steps(x: Float64Array): Float64Array {
  return x.subarray(1).map((at, i) => at - x[i]);
}
