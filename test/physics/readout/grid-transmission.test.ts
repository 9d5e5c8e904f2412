/** Transmission of a linear grid: the closed form, its table, and typical grids. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { energyGrid } from '../../../physics/beam/index.js';
import { gridSchema } from '../../../physics/case/schema.js';
import {
  type GridAtEnergy,
  gridAtEnergy,
  gridGeometry,
  gridTable,
  gridTransmission,
  meanGridTransmission,
} from '../../../physics/readout/index.js';
import { material } from '../scatter/stacks.js';

const gridOf = (entered: object) => gridGeometry(gridSchema.parse(entered), material);

const fibre10 = gridOf({ ratio: 10, strips_per_cm: 40, interspace: { material: 'cotton fibre' } });
const aluminium6 = gridOf({
  ratio: 6,
  strips_per_cm: 44,
  strip: { material: 'lead', thickness_um: 40 },
  cover: [{ material: 'aluminium', thickness_mm: 0.5 }],
});
const fibre15 = gridOf({
  ratio: 15,
  strips_per_cm: 36,
  interspace: { material: 'cotton fibre' },
  cover: [{ material: 'carbon fibre', thickness_mm: 0.5 }],
});

/** Strip crossed by a ray that has run a width y from a strip's edge. */
const stripWithin = (grid: GridAtEnergy, y: number): number => {
  const pitch = grid.strip_mm + grid.interspace_mm;
  const whole = Math.floor(y / pitch);
  return whole * grid.strip_mm + Math.min(y - whole * pitch, grid.strip_mm);
};

/** The same mean by stepping the entry point over one pitch, piece by piece between the corners. */
const byBruteForce = (grid: GridAtEnergy, beta: number, phi: number, points: number): number => {
  const pitch = grid.strip_mm + grid.interspace_mm;
  const slant = grid.height_mm / Math.cos(beta);
  const cross = slant * Math.sin(beta) * Math.abs(Math.cos(phi));
  const inPitch = (y: number): number => y - pitch * Math.floor(y / pitch);
  const corners = [0, grid.strip_mm, inPitch(-cross), inPitch(grid.strip_mm - cross), pitch].sort(
    (a, b) => a - b,
  );
  let mean = 0;
  for (let piece = 1; piece < corners.length; piece++) {
    const width = corners[piece] - corners[piece - 1];
    let sum = 0;
    for (let k = 0; k < points; k++) {
      const entry = corners[piece - 1] + ((k + 0.5) / points) * width;
      const inStrip =
        (slant * (stripWithin(grid, entry + cross) - stripWithin(grid, entry))) / cross;
      sum += Math.exp(-grid.strip_per_mm * inStrip - grid.interspace_per_mm * (slant - inStrip));
    }
    mean += (sum / points) * (width / pitch);
  }
  return Math.exp(-grid.coverDepth / Math.cos(beta)) * mean;
};

describe('the closed form of grid transmission', () => {
  it('agrees with averaging over the entry point by brute force to 5e-8', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(fibre10, aluminium6, fibre15),
        fc.double({ min: 20, max: 150, noNaN: true }),
        fc.double({ min: 0.002, max: 1.45, noNaN: true }),
        fc.double({ min: 0, max: 1.5, noNaN: true }),
        (grid, energy, beta, phi) => {
          const at = gridAtEnergy(grid, energy);
          const exact = gridTransmission(at, beta, phi);
          expect(Math.abs(exact - byBruteForce(at, beta, phi, 20_000))).toBeLessThan(5e-8);
        },
      ),
      { numRuns: 150, seed: 5 },
    );
  });

  it('at normal incidence is the share of interspace and of strip, each by its own attenuation', () => {
    const at = gridAtEnergy(aluminium6, 60);
    const { strip_mm: d, interspace_mm: D, height_mm: h } = at;
    const expected =
      (Math.exp(-at.coverDepth) *
        (d * Math.exp(-at.strip_per_mm * h) + D * Math.exp(-at.interspace_per_mm * h))) /
      (d + D);
    expect(gridTransmission(at, 0, 0.3)).toBeCloseTo(expected, 15);
    expect(gridTransmission(at, 1e-7, 0.3)).toBeCloseTo(expected, 5);
    expect(gridTransmission(at, 0.7, Math.PI / 2)).toBeLessThan(expected);
  });

  it('passes like a plain slab where strip and interspace are the same matter', () => {
    const at = { ...gridAtEnergy(fibre10, 60), strip_per_mm: 0.02, interspace_per_mm: 0.02 };
    for (const beta of [0, 0.1, 0.5, 1, 1.4]) {
      const slab = Math.exp((-0.02 * at.height_mm) / Math.cos(beta));
      expect(meanGridTransmission(at, beta)).toBeCloseTo(slab, 12);
    }
  });

  it('lets nothing through at grazing incidence and is never above 1 or below 0', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 8, max: 150, noNaN: true }),
        fc.double({ min: 0, max: Math.PI / 2, noNaN: true }),
        fc.double({ min: 0, max: 2 * Math.PI, noNaN: true }),
        (energy, beta, phi) => {
          const value = gridTransmission(gridAtEnergy(fibre10, energy), beta, phi);
          expect(value).toBeGreaterThanOrEqual(0);
          expect(value).toBeLessThanOrEqual(1);
        },
      ),
    );
    expect(gridTransmission(gridAtEnergy(fibre10, 60), Math.PI / 2, 0)).toBe(0);
  });

  it('falls when lead absorbs more: transmission of slanted photons drops across the K edge', () => {
    const below = meanGridTransmission(gridAtEnergy(fibre10, 87.9), 0.4);
    const above = meanGridTransmission(gridAtEnergy(fibre10, 88.1), 0.4);
    expect(above / below).toBeLessThan(0.4);
  });
});

describe('the table of mean grid transmission', () => {
  const grids = { fibre10, aluminium6, fibre15 };

  it.each(Object.entries(grids))(
    'misses the closed form by at most 0.0025 of full transmission anywhere: %s',
    (_name, grid) => {
      const table = gridTable(grid);
      let worst = 0;
      for (const energy of [15.5, 21.3, 33.1, 47.7, 63.2, 87.99, 88.02, 101.1, 139.5]) {
        for (let k = 0; k <= 300; k++) {
          const beta = (k / 300) * 1.57;
          const exact = meanGridTransmission(gridAtEnergy(grid, energy), beta);
          worst = Math.max(worst, Math.abs(table.lookup(energy, Math.cos(beta)) - exact));
        }
      }
      expect(worst).toBeLessThan(0.0025);
    },
  );

  it.each(Object.entries(grids))(
    'gives the transmitted share of isotropic scatter to 1e-3 from 20 keV: %s',
    (_name, grid) => {
      const table = gridTable(grid);
      for (const energy of [20.4, 30.3, 45.2, 60.1, 87.5, 88.4, 120.7]) {
        const at = gridAtEnergy(grid, energy);
        let exact = 0;
        let looked = 0;
        for (let k = 0; k < 2000; k++) {
          const cosBeta = (k + 0.5) / 2000;
          exact += cosBeta * meanGridTransmission(at, Math.acos(cosBeta));
          looked += cosBeta * table.lookup(energy, cosBeta);
        }
        expect(Math.abs(looked / exact - 1)).toBeLessThan(1e-3);
      }
    },
  );

  it('has the size that was planned and the K edge of lead as two nodes', () => {
    const { energies_keV, betas_rad, edges_keV } = gridTable(fibre10);
    expect(betas_rad).toHaveLength(48);
    expect(Math.abs(energies_keV.length - 150)).toBeLessThan(12);
    expect(edges_keV.some((edge) => Math.abs(edge - 88.0045) < 0.001)).toBe(true);
    const kEdge = edges_keV[edges_keV.length - 1];
    const above = energies_keV.findIndex((energy) => energy >= kEdge);
    expect(energies_keV[above] / energies_keV[above - 1] - 1).toBeLessThan(2e-6);
  });

  it('has a primary transmission that is exact at any energy, single or on a grid', () => {
    const table = gridTable(aluminium6);
    const { energies_keV } = energyGrid(120);
    const on = table.primaryOn(energies_keV);
    energies_keV.forEach((energy, i) => {
      expect(on[i]).toBeCloseTo(gridTransmission(gridAtEnergy(aluminium6, energy), 0, 0), 12);
    });
    expect(table.primary(60.2)).toBeCloseTo(
      gridTransmission(gridAtEnergy(aluminium6, 60.2), 0, 0),
      14,
    );
  });
});
