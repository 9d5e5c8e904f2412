import { describe, expect, test } from 'vitest';
import {
  clipMatrix,
  onPage,
  pivotOf,
  pivotOnPage,
  presetNames,
  presetView,
  projection,
  sectionView,
  shifted,
  stackAnchors,
  stackLayout,
  turned,
  zoomed,
} from '../../scenes/index.js';
import { sampleScene } from './sample.js';

const layout = stackLayout(sampleScene, 440, 640);
const anchors = stackAnchors(layout);

describe('the section view', () => {
  const p = projection(sectionView, layout);

  test('height on the page is linear along the beam', () => {
    const heights = [0, 50, 100, 150, 200].map((drawn) => onPage(p, [0, -drawn, 0])[1]);
    const steps = heights.slice(1).map((height, i) => height - heights[i]);
    for (const step of steps) expect(step).toBeCloseTo(50 * layout.px_per_mm, 9);
  });

  test('the anchors are where the axis is drawn', () => {
    expect(onPage(p, [0, 0, 0])).toEqual([
      expect.closeTo(anchors.axis, 9),
      expect.closeTo(anchors.source, 9),
    ]);
    expect(onPage(p, [0, -layout.skin, 0])[1]).toBeCloseTo(anchors.skin, 9);
    expect(onPage(p, [0, -layout.exit, 0])[1]).toBeCloseTo(anchors.exit, 9);
    expect(onPage(p, [0, -(layout.detail ?? 0), 0])[1]).toBeCloseTo(anchors.detail ?? 0, 9);
    expect(onPage(p, [0, -layout.detector.top, 0])[1]).toBeCloseTo(anchors.detector.top, 9);
    expect(onPage(p, [layout.body.halfWidth, 0, 0])[0]).toBeCloseTo(anchors.right, 9);
  });

  test('a mm across the cut face is as long as a mm down the patient', () => {
    const [x0, y0] = onPage(p, [0, -layout.skin, 0]);
    const [x1] = onPage(p, [10, -layout.skin, 0]);
    const [, y1] = onPage(p, [0, -layout.skin - 10, 0]);
    expect(x1 - x0).toBeCloseTo(y1 - y0, 9);
  });

  test('depth recedes to the right and up, as far as the anchors say', () => {
    const [x, y] = onPage(p, [0, 0, -layout.body.depth]);
    expect(x - anchors.axis).toBeCloseTo(anchors.recede.x, 9);
    expect(anchors.source - y).toBeCloseTo(anchors.recede.y, 9);
  });

  test('layer centres lie between their faces', () => {
    for (const { top, centre, bottom } of anchors.layers) {
      expect(centre).toBeCloseTo((top + bottom) / 2, 9);
    }
    expect(anchors.layers[0].top).toBeCloseTo(anchors.skin, 9);
    expect(anchors.layers.at(-1)?.bottom).toBeCloseTo(anchors.exit, 9);
  });
});

describe('turning, zooming and shifting', () => {
  const pivot = pivotOf(layout);

  test('the place turned about stays where it is', () => {
    for (const view of [
      turned(sectionView, 40, 0),
      turned(sectionView, -10, 60),
      zoomed(sectionView, 3),
    ]) {
      const [x, y] = onPage(projection(view, layout), pivot);
      expect(x).toBeCloseTo(pivotOnPage(layout)[0], 9);
      expect(y).toBeCloseTo(pivotOnPage(layout)[1], 9);
    }
  });

  test('the place under the pointer stays under it while zooming', () => {
    const [pivotX, pivotY] = pivotOnPage(layout);
    const place = [30, -layout.skin, 0] as const;
    const before = onPage(projection(sectionView, layout), place);
    const view = zoomed(sectionView, 2.5, [before[0] - pivotX, before[1] - pivotY]);
    const after = onPage(projection(view, layout), place);
    expect(after[0]).toBeCloseTo(before[0], 9);
    expect(after[1]).toBeCloseTo(before[1], 9);
  });

  test('the cut face cannot be turned out of sight', () => {
    const far = turned(sectionView, 500, 500);
    expect(far.azimuth_deg).toBe(80);
    expect(far.elevation_deg).toBe(90);
    expect(projection(turned(sectionView, 500, 0), layout).near[2]).toBeGreaterThan(0);
  });

  test('shifting moves everything by as many px', () => {
    const [x, y] = onPage(projection(sectionView, layout), [5, -7, -9]);
    const [sx, sy] = onPage(projection(shifted(sectionView, 11, -4), layout), [5, -7, -9]);
    expect([sx - x, sy - y]).toEqual([expect.closeTo(11, 9), expect.closeTo(-4, 9)]);
  });

  test('seen from the right, a nearer point is the one further to the right', () => {
    const { near } = projection(turned(sectionView, 45, 0), layout);
    expect(near[0]).toBeGreaterThan(0);
    expect(near[2]).toBeGreaterThan(0);
  });
});

describe('named views', () => {
  test('every whole view shows source, body and detector on the page', () => {
    const { halfWidth, depth } = layout.body;
    const points = [0, layout.skin, layout.exit, layout.detector.bottom].flatMap((drawn) =>
      [-1, 1].flatMap((side) =>
        [0, -depth].map((z) => [drawn === 0 ? 0 : side * halfWidth, -drawn, z] as const),
      ),
    );
    for (const name of presetNames.filter((each) => each !== 'detail')) {
      const p = projection(presetView(name, layout), layout);
      for (const point of points.filter(([, y, z]) => y < 0 || z === 0)) {
        const [x, y] = onPage(p, point);
        expect(x, name).toBeGreaterThan(0);
        expect(x, name).toBeLessThan(440);
        expect(y, name).toBeGreaterThan(0);
        expect(y, name).toBeLessThan(640);
      }
    }
  });

  test('the detail view has the detail in the middle of the page', () => {
    const p = projection(presetView('detail', layout, 6), layout);
    const [x, y] = onPage(p, [0, -(layout.detail ?? 0), 0]);
    expect(x).toBeCloseTo(220, 6);
    expect(y).toBeCloseTo(320, 6);
  });
});

describe('the clip matrix', () => {
  test('puts the corners of the page on the corners of the clip space, nearer in front', () => {
    const p = projection(sectionView, layout);
    const m = clipMatrix(p, 440, 640, 1000);
    const clip = ([x, y, z]: readonly number[]) =>
      [0, 1, 2].map((row) => m[row] * x + m[4 + row] * y + m[8 + row] * z + m[12 + row]);
    for (const point of [
      [0, 0, 0],
      [70, -120, -30],
      [-40, -300, 10],
    ] as const) {
      const [pageX, pageY] = onPage(p, point);
      const [cx, cy] = clip(point);
      expect(cx).toBeCloseTo((2 * pageX) / 440 - 1, 9);
      expect(cy).toBeCloseTo(1 - (2 * pageY) / 640, 9);
    }
    expect(clip([0, -100, 10])[2]).toBeLessThan(clip([0, -100, -10])[2]);
  });
});
