import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { kShell } from '../../../materials/index.js';
import {
  airKerma_uGy,
  attenuate,
  energyGrid,
  halfValueLayer_mm,
  kEdges_keV,
  tungstenSpectrum,
} from '../../../physics/beam/index.js';
import { kEdge_keV } from '../../../physics/beam/tungsten-coefficients.js';
import { aluminium, expectWithin, material } from './helpers.js';

describe('the energy grid', () => {
  test('runs in half keV from 5 keV and ends at the potential', () => {
    const { edges_keV, energies_keV, lineCount } = energyGrid(60.2);
    expect([...edges_keV.slice(0, 3)]).toEqual([5, 5.5, 6]);
    expect([...edges_keV.slice(-2)]).toEqual([60, 60.2]);
    expect(energies_keV[energies_keV.length - 1]).toBeCloseTo(60.1, 12);
    expect(lineCount).toBe(0);
  });

  test('has a boundary at every K edge inside, given in any order and repeatedly', () => {
    const { edges_keV } = energyGrid(80, [37.44, 33.17, 33.17, 88.005, 4]);
    expect([...edges_keV]).toEqual(expect.arrayContaining([33.17, 37.44, kEdge_keV]));
    expect([...edges_keV]).toEqual([...new Set(edges_keV)].sort((a, b) => a - b));
    expect(edges_keV[0]).toBe(5);
    expect(edges_keV[edges_keV.length - 1]).toBe(80);
  });

  test('is one object for one potential and edge set, whatever the order of the edges', () => {
    expect(energyGrid(80, [37.44, 33.17])).toBe(energyGrid(80, [33.17, 37.44, 33.17]));
    expect(energyGrid(80, [33.17])).not.toBe(energyGrid(80));
  });

  test('covers its range without gap or overlap', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 20, max: 150, noNaN: true }),
        fc.array(fc.double({ min: 1, max: 160, noNaN: true }), { maxLength: 8 }),
        (potential, edges) => {
          const { edges_keV, energies_keV, lineCount } = energyGrid(potential, edges);
          expect(energies_keV.length).toBe(edges_keV.length - 1 + lineCount);
          for (let i = 1; i < edges_keV.length; i++) {
            expect(edges_keV[i]).toBeGreaterThan(edges_keV[i - 1]);
            expect(edges_keV[i] - edges_keV[i - 1]).toBeLessThanOrEqual(0.5);
          }
        },
      ),
    );
  });

  test("the tube model and the materials agree on tungsten's K edge", () => {
    expect(kShell(74)?.edge_keV).toBe(kEdge_keV);
  });

  test('K edges of materials are found once each, below 5 keV left out (I 33.17, Ba 37.44, common practice)', () => {
    const found = kEdges_keV([
      material('iodine'),
      material('barium'),
      material('iodine'),
      aluminium,
    ]);
    expect(found.map((edge) => edge.toFixed(2))).toEqual(['33.17', '37.44']);
  });
});

test.each(['iodine', 'tin', 'gadolinium'])(
  'with the K edge of %s on a boundary the half-value layer behind 200 mg/cm² is that of a grid ten times finer within 0.1 %',
  (name) => {
    const foil = material(name);
    const layers = [
      { material: aluminium, thickness_mm: 2.5 },
      { material: foil, thickness_mm: 2 / foil.density_g_per_cm3 },
    ];
    const edges = kEdges_keV([foil]);
    const fine = Array.from({ length: 1900 }, (_, i) => 5 + i * 0.05);
    const layerWith = (extraEdges_keV: readonly number[]) =>
      halfValueLayer_mm(
        attenuate(
          tungstenSpectrum({ potential_kV: 100, anodeAngle_deg: 12, extraEdges_keV }),
          layers,
        ),
        aluminium,
      ) ?? Number.NaN;
    expectWithin(layerWith(edges), layerWith([...edges, ...fine]), 0.1, 'HVL1');
  },
);

test('a beam evaluated on the grid of a higher potential keeps its kerma within 0.05 %', () => {
  const grid = energyGrid(90);
  for (const potential_kV of [60.13, 69.9, 80, 88.77]) {
    const layers = [{ material: aluminium, thickness_mm: 2.5 }];
    const own = attenuate(tungstenSpectrum({ potential_kV, anodeAngle_deg: 12 }), layers);
    const shared = attenuate(tungstenSpectrum({ potential_kV, anodeAngle_deg: 12, grid }), layers);
    expect(shared.energies_keV).toBe(grid.energies_keV);
    expectWithin(airKerma_uGy(shared), airKerma_uGy(own), 0.05, `${potential_kV} kV`);
  }
});
