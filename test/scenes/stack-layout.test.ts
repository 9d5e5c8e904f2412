import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { alongBeam, type StackScene, stackLayout } from '../../scenes/index.js';
import { sampleScene } from './sample.js';

const layout = stackLayout(sampleScene, 440, 640);

/** Stacks of any number of layers in rooms of any size, on pages of any size. */
const anyStack = fc
  .record({
    thicknesses: fc.array(fc.double({ min: 0.1, max: 400, noNaN: true }), {
      minLength: 1,
      maxLength: 12,
    }),
    toSkin: fc.double({ min: 1, max: 3000, noNaN: true }),
    gap: fc.double({ min: 0, max: 800, noNaN: true }),
    field: fc.double({ min: 1, max: 600, noNaN: true }),
    beam: fc.constantFrom('point' as const, 'parallel' as const),
    hasGrid: fc.boolean(),
    width: fc.integer({ min: 120, max: 1200 }),
    height: fc.integer({ min: 160, max: 1400 }),
  })
  .map(({ thicknesses, toSkin, gap, field, beam, hasGrid, width, height }) => {
    const total = thicknesses.reduce((sum, each) => sum + each, 0);
    const scene: StackScene = {
      ...sampleScene,
      beam,
      sourceToSkin_mm: toSkin,
      sourceToDetector_mm: toSkin + total + gap,
      field_mm: [field, field],
      layers: thicknesses.map((thickness_mm, i) => ({
        name: `layer ${i}`,
        material: 'water',
        family: 'liquid',
        thickness_mm,
      })),
      detail: null,
      grid: hasGrid ? { label: 'grid' } : null,
    };
    return { scene, width, height };
  });

describe('the scale along the beam', () => {
  const scale = alongBeam([
    { distance_mm: 0, drawn_mm: 0 },
    { distance_mm: 800, drawn_mm: 100 },
    { distance_mm: 1000, drawn_mm: 300 },
  ]);

  test('runs straight between its knots', () => {
    expect(scale.drawnAt(400)).toBeCloseTo(50, 12);
    expect(scale.drawnAt(900)).toBeCloseTo(200, 12);
  });

  test('is undone by its inverse, also beyond its ends', () => {
    for (const distance of [-50, 0, 333, 800, 950, 1200]) {
      expect(scale.distanceAt(scale.drawnAt(distance))).toBeCloseTo(distance, 9);
    }
  });
});

describe('the layout of the stack', () => {
  test('patient layers keep their true proportion to each other and to the field', () => {
    const heights = layout.layers.map(({ top, bottom }) => bottom - top);
    expect(heights[0]).toBeCloseTo(20, 9);
    expect(heights[1]).toBeCloseTo(170, 9);
    expect(heights[2]).toBeCloseTo(10, 9);
    // The field at the exit face: 250 mm × (850 + 200) / 1150, half of it.
    expect(layout.halfField(layout.exit)[0]).toBeCloseTo((125 * 1050) / 1150, 9);
  });

  test('free air above the patient is shortened, and the drawing knows by how much', () => {
    const [air] = layout.shortened;
    // 850 mm to the skin less 2 mm of support.
    expect(air.length_mm).toBe(848);
    expect(air.factor).toBeCloseTo(848 / layout.supportEntrance[0].top, 9);
    expect(air.factor).toBeGreaterThan(1);
  });

  test('a thick support keeps its true height, and free air ends where it begins', () => {
    const foam = { name: 'pad', material: 'foam', family: 'plastic' as const, thickness_mm: 40 };
    const padded = stackLayout({ ...sampleScene, supportEntrance: [foam] }, 440, 640);
    const [{ top, bottom }] = padded.supportEntrance;
    expect(bottom - top).toBeCloseTo(40, 9);
    expect(bottom).toBeCloseTo(padded.skin, 9);
    expect(padded.along.distanceAt(top)).toBeCloseTo(810, 9);
    expect(padded.shortened[0].at).toBeLessThan(top);
    expect(padded.filter.bottom).toBeLessThan(top);
  });

  test('the detail stands at its depth in the patient', () => {
    expect(layout.detail).toBeCloseTo(layout.skin + 105, 9);
  });

  test('a parallel beam is as wide at the skin as at the detector', () => {
    const parallel = stackLayout({ ...sampleScene, beam: 'parallel' }, 440, 640);
    expect(parallel.halfField(parallel.skin)).toEqual([125, 100]);
    expect(parallel.halfField(parallel.detector.top)).toEqual([125, 100]);
  });

  test('a finite body keeps its own width', () => {
    const narrow = stackLayout({ ...sampleScene, lateral_mm: [160, 120] }, 440, 640);
    expect(narrow.body).toEqual({ halfWidth: 80, depth: 60 });
  });

  test('whatever the stack, everything stands in the order of the beam and on the page', () => {
    fc.assert(
      fc.property(anyStack, ({ scene, width, height }) => {
        const { layers, skin, exit, grid, detector, filter, origin_px, px_per_mm } = stackLayout(
          scene,
          width,
          height,
        );
        const order = [
          0,
          filter.top,
          skin,
          ...layers.flatMap(({ top, bottom }) => [top, bottom]),
          exit,
          ...(grid ? [grid.top, grid.bottom] : []),
          detector.top,
          detector.bottom,
        ];
        for (let i = 1; i < order.length; i += 1) {
          expect(order[i]).toBeGreaterThanOrEqual(order[i - 1] - 1e-6);
        }
        expect(origin_px.y).toBeGreaterThanOrEqual(0);
        expect(origin_px.y + detector.top * px_per_mm).toBeLessThanOrEqual(height);
      }),
    );
  });

  test('layers stay in proportion whatever the stack', () => {
    fc.assert(
      fc.property(anyStack, ({ scene, width, height }) => {
        const { layers } = stackLayout(scene, width, height);
        layers.forEach(({ top, bottom }, i) => {
          expect(bottom - top).toBeCloseTo(scene.layers[i].thickness_mm, 6);
        });
      }),
    );
  });
});
