import { describe, expect, it } from 'vitest';
import { logTicks } from '../../components/charts/frontier-chart.js';
import { levelRegions, levels } from '../../components/charts/sweep-map-contours.js';
import {
  forbiddenRuns,
  type MapCell,
  mapLayout,
  placeAt,
  type SweepMapData,
} from '../../components/charts/sweep-map-layout.js';

const cell = (merit: number | null, forbidden: string | null = null): MapCell => ({
  merit,
  forbidden,
});
const data: SweepMapData = {
  meritName: 'SdNR² per incident air kerma',
  meritUnit: 'per mGy',
  holdConstant: 'equal SdNR',
  size: 'one',
  potentials_kV: [50, 60, 70, 80, 85],
  rows: ['none', '0.1 Cu', '0.3 Cu'].map((filter) => ({
    filter,
    cells: [0.4, 0.6, 1, 0.8, 0.5].map((merit) => cell(merit)),
  })),
  marks: [],
  best: { potential_kV: 70, filter: 'none', merit: 1, window90_kV: [70, 70] },
  investigational: null,
};

describe('the layout of the map', () => {
  const layout = mapLayout(data, 700);

  it('finds every setting again from the middle of its place', () => {
    data.potentials_kV.forEach((kV, column) => {
      data.rows.forEach((_, row) => {
        const y = layout.rowTop(row) + layout.rowHeight / 2;
        expect(placeAt(layout, data, { x: layout.x(kV), y })).toEqual({ column, row });
      });
    });
  });

  it('finds none outside', () => {
    expect(placeAt(layout, data, { x: layout.left - 1, y: layout.top + 5 })).toBeNull();
    expect(placeAt(layout, data, { x: layout.left + 5, y: layout.bottom + 1 })).toBeNull();
  });

  it('leaves no gap and no overlap between potentials, also where the last step is shorter', () => {
    expect(layout.edges).toHaveLength(6);
    expect(layout.edges).toEqual([...layout.edges].sort((a, b) => a - b));
    expect(layout.edges[4]).toBeCloseTo(layout.x(82.5), 9);
  });
});

describe('contours of one filter', () => {
  /** Places in kV instead of px, a potential every 10 kV from 50. */
  const kV = (index: number) => 50 + 10 * index;
  const regions = levelRegions([0.4, 0.6, 1, 0.8, 0.5], kV, { top: 0, bottom: 30 });
  const xs = (path: string) => [...path.matchAll(/[ML](-?[\d.]+),/g)].map(([, x]) => Number(x));

  it('lie where the figure of merit crosses the level, linearly between potentials', () => {
    const half = regions.find(({ level }) => level === levels.indexOf(0.5) + 1);
    // 0.5 is crossed halfway from 50 to 60 kV, and held up to 90 kV.
    expect(Math.min(...xs(half?.path ?? ''))).toBeCloseTo(55, 1);
    const most = regions.find(({ level }) => level === levels.indexOf(0.9) + 1);
    expect(Math.min(...xs(most?.path ?? ''))).toBeCloseTo(67.5, 1);
    expect(Math.max(...xs(most?.path ?? ''))).toBeCloseTo(75, 1);
  });

  it('are none for levels never reached, and none without settings', () => {
    const low = levelRegions([0.1, 0.2, 0.55], kV, { top: 0, bottom: 30 });
    expect(low.map(({ level }) => level)).toEqual([1]);
    expect(levelRegions([], kV, { top: 0, bottom: 30 })).toEqual([]);
  });

  it('go on under settings without a value, which the drawing covers', () => {
    const band = { top: 0, bottom: 30 };
    const gaps = levelRegions([null, 0.4, null, null, 1], kV, band);
    expect(gaps).toEqual(levelRegions([0.4, 0.4, 0.4, 1, 1], kV, band));
    expect(levelRegions([null, null], kV, band)).toEqual([]);
  });
});

describe('forbidden settings', () => {
  it('are joined to runs of one limit', () => {
    const cells = [cell(1, 'a'), cell(1, 'a'), cell(1), cell(1, 'a'), cell(1, 'b')];
    expect(forbiddenRuns(cells)).toEqual([
      { limit: 'a', from: 0, to: 1 },
      { limit: 'a', from: 3, to: 3 },
      { limit: 'b', from: 4, to: 4 },
    ]);
  });
});

describe('figures of a logarithmic axis', () => {
  it.each([
    [1, 3, 6],
    [0.2, 900, 6],
    [14.2, 15.1, 6],
  ])('lie within %d and %d, at most %d of them', (low, high, most) => {
    const ticks = logTicks(low, high, most);
    expect(ticks.length).toBeGreaterThan(0);
    expect(ticks.length).toBeLessThanOrEqual(most);
    for (const tick of ticks) {
      expect(tick).toBeGreaterThanOrEqual(low * 0.95);
      expect(tick).toBeLessThanOrEqual(high * 1.05);
    }
  });
});
