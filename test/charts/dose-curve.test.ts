import { describe, expect, test } from 'vitest';
import { curveScales, type DoseCurveData, pointsAt } from '../../components/charts/dose-curve.js';
import { placeLabels } from '../../components/charts/label-places.js';
import { ratioPosition } from '../../components/charts/ratio-bar.js';

const line = (filter: string, scale: number) => ({
  filter,
  ink: null,
  points: [60, 70, 80].map((potential_kV) => ({
    potential_kV,
    dose: (scale * 100) / potential_kV,
    value: 1000 / potential_kV,
    forbidden: null,
  })),
});
const data: DoseCurveData = {
  valueName: 'SdNR of the vessel',
  doseName: 'incident air kerma per frame',
  doseUnit: 'mGy',
  holdConstant: 'equal detector air kerma',
  size: 'median',
  lines: [line('none', 1), line('0.2 Cu', 0.5)],
  marks: [{ ink: 0, name: 'Current', potential_kV: 80, dose: 1.25, value: 12.5 }],
  rose: 5,
  investigational: null,
};

describe('the contrast-versus-dose curve', () => {
  test('shows from nothing to twice what the techniques cost', () => {
    const { x } = curveScales(data, { width: 360, height: 250 });
    expect(x.domain()[0]).toBe(0);
    expect(x.domain()[1]).toBeGreaterThanOrEqual(2.5);
    expect(x.domain()[1]).toBeLessThan(4);
  });

  test('shows the Rose threshold even where every value is below it', () => {
    const { y } = curveScales(
      { ...data, lines: [], marks: [], rose: 5 },
      { width: 360, height: 250 },
    );
    expect(y.domain()[1]).toBeGreaterThanOrEqual(5);
  });

  test('shows contrasts below zero for an agent more transparent than what it replaces', () => {
    const negative = {
      ...data,
      rose: null,
      lines: [
        {
          ...line('none', 1),
          points: [{ potential_kV: 60, dose: 1, value: -0.3, forbidden: null }],
        },
      ],
      marks: [],
    };
    expect(curveScales(negative, { width: 360, height: 250 }).y.domain()[0]).toBeLessThanOrEqual(
      -0.3,
    );
  });

  test('reads every line at the potential nearest to the cursor', () => {
    expect(
      pointsAt(data, 72).map(({ line: { filter }, point }) => [filter, point.potential_kV]),
    ).toEqual([
      ['none', 70],
      ['0.2 Cu', 70],
    ]);
  });
});

describe('names on a plot', () => {
  const frame = { left: 0, right: 300, top: 0, bottom: 200 };

  test('of two marks at one place do not cover each other', () => {
    const mark = { x: 150, y: 100, width: 80, height: 13 };
    const [a, b] = placeLabels([mark, mark], [], frame);
    expect(a.x !== b.x || Math.abs(a.y - b.y) >= 12).toBe(true);
  });

  test('stay inside the frame where there is room', () => {
    const [place] = placeLabels([{ x: 295, y: 100, width: 80, height: 13 }], [], frame);
    expect(place.x + 80).toBeLessThanOrEqual(300);
  });
});

describe('ratio bars', () => {
  test('are as long for half as for twice', () => {
    const middle = ratioPosition(1);
    expect(ratioPosition(2) - middle).toBeCloseTo(middle - ratioPosition(0.5), 9);
  });

  test('do not run off the paper', () => {
    expect(ratioPosition(1000)).toBe(ratioPosition(4));
    expect(ratioPosition(1e-6)).toBe(ratioPosition(0.25));
  });
});
