import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  densityRows,
  densitySteps,
  inkScale,
  inkTicks,
  type Shading,
  stackLayout,
  stepProfile,
  valueAt,
} from '../../scenes/index.js';
import { sampleScene } from './sample.js';

const shading = (scale: 'log' | 'linear', values: number[]): Shading => ({
  ...sampleScene.primary,
  scale,
  perTechnique: [{ depths_mm: values.map((_, i) => 10 * i), values }],
});

describe('ink of a quantity', () => {
  test('a factor of ten is the same step of ink anywhere on a log scale', () => {
    const { density } = inkScale(shading('log', [1e6, 1e3]));
    const step = density(1e6) - density(1e5);
    expect(density(1e5) - density(1e4)).toBeCloseTo(step, 12);
    expect(density(1e4) - density(1e3)).toBeCloseTo(step, 12);
    expect(step).toBeGreaterThan(0);
  });

  test('is in proportion to the value, above a least tint, on a linear scale', () => {
    const { density } = inkScale(shading('linear', [0, 2, 4]));
    expect(density(3) - density(2)).toBeCloseTo(density(2) - density(1), 12);
    expect(density(0)).toBe(0);
  });

  test('never falls as the value rises, and is a share of full ink', () => {
    const { density } = inkScale(shading('log', [1e6, 50]));
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 1e12, noNaN: true }),
        fc.double({ min: 1, max: 100, noNaN: true }),
        (value, factor) => {
          expect(density(value * factor)).toBeGreaterThanOrEqual(density(value));
          expect(density(value)).toBeGreaterThanOrEqual(0);
          expect(density(value)).toBeLessThan(1);
        },
      ),
    );
  });

  test('is the same for the same value in both techniques', () => {
    const rows = densityRows(
      { ...sampleScene, techniques: sampleScene.techniques },
      stackLayout(sampleScene, 440, 640),
      {
        ...sampleScene.primary,
        perTechnique: [sampleScene.primary.perTechnique[0], sampleScene.primary.perTechnique[0]],
      },
    );
    expect(rows[0]).toEqual(rows[1]);
  });

  test('nothing known or nothing there is bare paper', () => {
    const unknown = inkScale({ ...sampleScene.primary, perTechnique: [null, null] });
    expect(unknown.density(5)).toBe(0);
    expect(inkTicks(unknown)).toEqual([]);
    expect(inkScale(shading('log', [0, 0])).density(1)).toBe(0);
  });

  test('a legend marks powers of ten between least and most', () => {
    const ticks = inkTicks(inkScale(shading('log', [2e6, 3e4])));
    expect(ticks).toEqual([1e5, 1e6]);
  });
});

describe('a value between two depths', () => {
  const profile = { depths_mm: [0, 10, 20], values: [100, 1, 1] };

  test('is interpolated in equal ratios', () => {
    expect(valueAt(profile, 5)).toBeCloseTo(10, 12);
    expect(valueAt(profile, 15)).toBe(1);
  });

  test('is unknown outside the profile', () => {
    expect(valueAt(profile, -0.1)).toBeNull();
    expect(valueAt(profile, 20.1)).toBeNull();
    expect(valueAt({ depths_mm: [], values: [] }, 0)).toBeNull();
  });

  test('runs straight to a zero', () => {
    expect(valueAt({ depths_mm: [0, 10], values: [8, 0] }, 5)).toBe(4);
  });
});

describe('a quantity of whole layers', () => {
  test('keeps its value through each layer and steps at their faces', () => {
    const profile = stepProfile([0, 20, 190, 200], [3, 1, 8]);
    expect([5, 100, 195].map((depth) => valueAt(profile, depth))).toEqual([3, 1, 8]);
    expect(valueAt(profile, 200.5)).toBeNull();
  });
});

describe('ink along the drawn beam', () => {
  test('fades from skin to detector, darker where more photons are', () => {
    const layout = stackLayout(sampleScene, 440, 640);
    const [current, proposed] = densityRows(sampleScene, layout, sampleScene.primary);
    const at = (drawn: number) => Math.floor((drawn / layout.detector.top) * densitySteps);
    expect(current[at(layout.skin + 1)]).toBeGreaterThan(current[at(layout.exit - 1)]);
    expect(current[at(layout.skin + 1)]).toBeGreaterThan(proposed[at(layout.skin + 1)]);
    expect(current[at(layout.exit - 1)]).toBeGreaterThan(0);
  });
});
