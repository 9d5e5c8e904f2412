import { type Material, massAttenuation } from '../../materials/index.js';
import { opticalDepth } from '../beam/attenuate.js';
import { locate, locatorOf } from '../numeric/locate.js';
import { edgeNodes, edgesWithin } from './edge-nodes.js';
import type { GridGeometry } from './grid-geometry.js';
import { type GridAtEnergy, meanGridTransmission } from './grid-transmission.js';

/** Azimuth-mean transmission of one grid over energy and polar angle, for scatter behind it. */
export interface GridTable {
  /** Ascending, 8 to 150 keV; every edge of the grid's matter stands as two nodes a hair apart. */
  readonly energies_keV: Float64Array;
  /** Polar angles 0 to π/2, spaced as j². */
  readonly betas_rad: Float64Array;
  /** T̄ at [energy][beta], energy-major. */
  readonly values: Float64Array;
  /** Absorption edges of strips, interspace and covers within the range. */
  readonly edges_keV: readonly number[];
  /** T̄ at an energy (held at the ends of the range) and the cosine of the polar angle. */
  readonly lookup: (energy_keV: number, cosBeta: number) => number;
  /** Transmission at normal incidence, exact at any energy. */
  readonly primary: (energy_keV: number) => number;
  readonly primaryOn: (energies_keV: Float64Array) => Float64Array;
}

const range_keV = [8, 150] as const;
const energyNodes = 150;
const betaNodes = 48;

const per_mm = (material: Material, energy_keV: number): number =>
  (massAttenuation(material, energy_keV) * material.density_g_per_cm3) / 10;

/** The grid's attenuation at one energy, for the closed form. */
export const gridAtEnergy = (grid: GridGeometry, energy_keV: number): GridAtEnergy => ({
  strip_mm: grid.strip_mm,
  interspace_mm: grid.interspace_mm,
  height_mm: grid.height_mm,
  strip_per_mm: per_mm(grid.stripMaterial, energy_keV),
  interspace_per_mm: per_mm(grid.interspaceMaterial, energy_keV),
  coverDepth: grid.covers.reduce(
    (sum, cover) => sum + per_mm(cover.material, energy_keV) * cover.thickness_mm,
    0,
  ),
});

const tabulate = (
  grid: GridGeometry,
  energies_keV: Float64Array,
  betas_rad: Float64Array,
): Float64Array => {
  const values = new Float64Array(energies_keV.length * betas_rad.length);
  energies_keV.forEach((energy_keV, i) => {
    const at = gridAtEnergy(grid, energy_keV);
    betas_rad.forEach((beta_rad, j) => {
      values[i * betas_rad.length + j] = meanGridTransmission(at, beta_rad);
    });
  });
  return values;
};

/** Cubic through four neighbouring values (Catmull–Rom), at share t between the inner two. */
const cubic = (before: number, low: number, high: number, after: number, t: number): number => {
  const s = 1 - t;
  return (
    s * s * ((1 + 2 * t) * low + (t * (high - before)) / 2) +
    t * t * ((1 + 2 * s) * high - (s * (after - low)) / 2)
  );
};

/**
 * Tabulates a grid once, about 150 energies × 48 angles (some 50 ms); a lookup is then a cubic in
 * √β and linear in energy.
 *
 * Error of a lookup against the closed form, 6:1 to 15:1 lead grids, 20–140 keV: at most 0.0025 of
 * full transmission anywhere, and 1e-3 of the transmitted share of isotropic scatter (tested).
 */
export const gridTable = (grid: GridGeometry): GridTable => {
  const [from, to] = range_keV;
  const covers = grid.covers.map(({ material }) => material);
  const edges_keV = edgesWithin([grid.stripMaterial, grid.interspaceMaterial, ...covers], from, to);
  const energies_keV = edgeNodes(from, to, edges_keV, energyNodes / Math.log(to / from));
  const betas_rad = Float64Array.from(
    { length: betaNodes },
    (_, j) => (Math.PI / 2) * (j / (betaNodes - 1)) ** 2,
  );
  const values = tabulate(grid, energies_keV, betas_rad);
  const locator = locatorOf(energies_keV);
  const last = betaNodes - 1;
  const scale = last / Math.sqrt(Math.PI / 2);
  const lowest = energies_keV[0];
  const highest = energies_keV[energies_keV.length - 1];

  const alongBeta = (row: number, j: number, t: number): number => {
    const low = values[row + j];
    const high = values[row + j + 1];
    // T̄ is even in √β, so its slope at β = 0 is zero.
    const before = j > 0 ? values[row + j - 1] : high;
    const after = j + 2 <= last ? values[row + j + 2] : 0;
    return cubic(before, low, high, after, t);
  };

  const lookup = (energy_keV: number, cosBeta: number): number => {
    const energy = Math.min(highest, Math.max(lowest, energy_keV));
    const place = scale * Math.sqrt(Math.acos(Math.min(1, Math.max(0, cosBeta))));
    const j = Math.min(last - 1, Math.floor(place));
    const t = place - j;
    const i = locate(locator, energy);
    const share = (energy - energies_keV[i]) / (energies_keV[i + 1] - energies_keV[i]);
    const low = alongBeta(i * betaNodes, j, t);
    const high = alongBeta((i + 1) * betaNodes, j, t);
    return Math.max(0, low + share * (high - low));
  };

  const primary = (energy_keV: number): number =>
    meanGridTransmission(gridAtEnergy(grid, energy_keV), 0);

  const primaryOn = (energies: Float64Array): Float64Array => {
    const strip = opticalDepth(energies, [
      { material: grid.stripMaterial, thickness_mm: grid.height_mm },
    ]);
    const interspace = opticalDepth(energies, [
      { material: grid.interspaceMaterial, thickness_mm: grid.height_mm },
    ]);
    const cover = opticalDepth(energies, grid.covers);
    const pitch_mm = grid.strip_mm + grid.interspace_mm;
    return cover.map(
      (depth, i) =>
        (Math.exp(-depth) *
          (grid.strip_mm * Math.exp(-strip[i]) + grid.interspace_mm * Math.exp(-interspace[i]))) /
        pitch_mm,
    );
  };
  return { energies_keV, betas_rad, values, edges_keV, lookup, primary, primaryOn };
};
