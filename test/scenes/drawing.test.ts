import { describe, expect, test } from 'vitest';
import { trackPens, trackStrokes } from '../../scenes/drawing/track-strokes.js';
import { rgbOf, type Shading, stackDrawing, stackLayout, trackKinds } from '../../scenes/index.js';
import { sampleScene, sampleTracks } from './sample.js';

const layout = stackLayout(sampleScene, 440, 640);
const drawn = stackDrawing(sampleScene, layout);
const energy: Shading = {
  quantity: 'energy absorbed per depth',
  unit: 'mJ/cm',
  scale: 'linear',
  extent: 'body',
  perTechnique: [{ depths_mm: [0, 200], values: [2, 1] }, null],
};

describe('the drawing of the stack', () => {
  test('is made of numbers throughout', () => {
    const points = [
      ...drawn.faces.flatMap((face) => face.corners),
      ...drawn.washes.flatMap((wash) => wash.corners),
      ...drawn.strokes.flatMap(({ from, to }) => [from, to]),
    ];
    expect(points.length).toBeGreaterThan(500);
    expect(points.flat().every(Number.isFinite)).toBe(true);
  });

  test('every layer is hatched by its family on the cut face alone', () => {
    const hatched = drawn.faces.filter((face) => face.hatch !== undefined);
    expect(hatched.map((face) => face.hatch)).toEqual([
      'metal',
      'plastic',
      'adipose',
      'soft tissue',
      'bone',
    ]);
    for (const face of hatched) expect(face.corners.every(([, , z]) => z === 0)).toBe(true);
  });

  test('the beam is split at the axis, Current to the left and Proposed to the right', () => {
    for (const { technique, corners } of drawn.washes) {
      for (const [x] of corners) {
        if (technique === 0) expect(x).toBeLessThanOrEqual(0);
        else expect(x).toBeGreaterThanOrEqual(0);
      }
    }
  });

  test('a technique alone has both halves', () => {
    const alone = stackDrawing({ ...sampleScene, techniques: [sampleScene.techniques[0]] }, layout);
    expect(new Set(alone.washes.map((wash) => wash.technique))).toEqual(new Set([0]));
    expect(alone.washes.some((wash) => wash.corners.some(([x]) => x > 0))).toBe(true);
  });

  test('no beam ray bends anywhere but where the scale along it does', () => {
    const front = drawn.washes.filter(({ corners }) => corners.every(([, , z]) => z > 0));
    const heights = new Set(front.flatMap(({ corners }) => corners.map(([, y]) => -y)));
    const knots = layout.along.knots.map((knot) => knot.drawn_mm);
    expect(
      [...heights].every((height) => knots.some((knot) => Math.abs(knot - height) < 1e-9)),
    ).toBe(true);
  });

  test('a quantity of the whole body fills the cut face and leaves the beam an outline', () => {
    const { washes } = stackDrawing({ ...sampleScene, shading: energy }, layout);
    expect(washes).toHaveLength(2);
    const xs = washes.flatMap(({ corners }) => corners.map(([x]) => Math.abs(x)));
    expect(Math.max(...xs)).toBe(layout.body.halfWidth);
  });

  test('grid strips are drawn only for a technique that has the grid in', () => {
    const [current, proposed] = sampleScene.techniques;
    const half = stackDrawing(
      { ...sampleScene, techniques: [current, { ...(proposed ?? current), isGridIn: false }] },
      layout,
    );
    const strips = half.strokes.filter(
      ({ pen, from, to }) =>
        pen.ink === 'ink' && from[1] !== to[1] && from[1] === -(layout.grid?.top ?? 0),
    );
    expect(strips.length).toBeGreaterThan(10);
    expect(strips.every(({ from }) => from[0] < 0)).toBe(true);
  });

  test('grid strips lean toward the focal spot', () => {
    const strip = drawn.strokes.find(
      ({ from, to }) =>
        from[1] === -(layout.grid?.top ?? 0) &&
        to[1] === -(layout.grid?.bottom ?? 0) &&
        from[0] > 50,
    );
    expect(strip?.to[0]).toBeGreaterThan(strip?.from[0] ?? 0);
  });

  test('an absent detail is left empty', () => {
    const detail = sampleScene.detail && { ...sampleScene.detail, isAbsence: true };
    const { faces } = stackDrawing({ ...sampleScene, detail }, layout);
    expect(faces.filter((face) => face.over).map((face) => face.fill)).toEqual(['paper']);
  });

  test('a stack without detail, grid or support is drawn as well', () => {
    const bare = { ...sampleScene, detail: null, grid: null, supportEntrance: [] };
    const { faces } = stackDrawing(bare, stackLayout(bare, 440, 640));
    expect(faces.some((face) => face.over)).toBe(false);
  });
});

describe('photon tracks', () => {
  const strokes = trackStrokes(sampleTracks, layout, sampleScene.sourceToSkin_mm);

  test('begin and end at their depths on the scale of the drawing', () => {
    expect(strokes[0].from[1]).toBeCloseTo(0, 9);
    const compton = strokes.find(({ pen }) => pen.width_px === 1 && !pen.dash);
    expect(compton?.from[1]).toBeCloseTo(-(layout.skin + 40), 9);
    expect(compton?.to[1]).toBeCloseTo(-(layout.skin + 90), 9);
  });

  test('a piece that enters the patient from shortened air bends at the skin', () => {
    const bends = strokes.filter(({ to }) => Math.abs(to[1] + layout.skin) < 1e-9);
    expect(bends).toHaveLength(1);
    // 850 of 890 mm down a path that ends 10 mm off the axis.
    expect(bends[0].to[0]).toBeCloseTo((10 * 850) / 890, 4);
  });

  test('kinds differ in weight or dash, and an absorption is a point', () => {
    const looks = trackKinds.map(
      (kind) => `${trackPens[kind].width_px} ${trackPens[kind].dash ?? ''}`,
    );
    expect(new Set(looks).size).toBe(trackKinds.length);
    const absorbed = strokes.at(-1);
    expect(absorbed?.from).toEqual(absorbed?.to);
  });
});

describe('colours', () => {
  test('are read from #rrggbb, and anything else is black', () => {
    expect(rgbOf('#ff8000')).toEqual([1, 128 / 255, 0]);
    expect(rgbOf('tomato')).toEqual([0, 0, 0]);
  });
});
