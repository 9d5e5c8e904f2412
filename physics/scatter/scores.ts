import { massEnergyAbsorptionOn, namedMaterial } from '../../materials/index.js';
import { kept } from '../../materials/kept.js';
import type { EnergyNodes } from './energy-nodes.js';

/** What scatter asks of a detector: per photon of an energy at a cosine to the normal. */
export interface ScatterDetector {
  /** Detected photons η. */
  efficiency(energy_keV: number, cosine: number): number;
  /** Absorbed energy fraction ε. */
  energyFraction(energy_keV: number, cosine: number): number;
  /** Mean square of the absorbed energy fraction ε₂. */
  energySquareFraction(energy_keV: number, cosine: number): number;
  /** Absorption edges of the detecting material. */
  readonly edges_keV: readonly number[];
}

/** What scatter asks of a grid: its transmission averaged over azimuth, covers included. */
export interface ScatterGrid {
  lookup(energy_keV: number, cosine: number): number;
  readonly edges_keV: readonly number[];
}

/** The four things scored at the detector, in this order everywhere. */
export const scoreNames = ['signal', 'noise', 'counts', 'airKerma'] as const;
export const scoreCount = scoreNames.length;
export const airKermaScore = scoreNames.indexOf('airKerma');

/**
 * Scores of one photon without grid: signal E·ε, noise E²·ε₂, counts η. The fourth score, air kerma,
 * is E·(μen/ρ)air per fluence: it wants 1/cosβ where photons are counted through a plane.
 */
export function photonScores(
  detector: ScatterDetector,
  energy_keV: number,
  cosine: number,
): readonly [number, number, number] {
  return [
    energy_keV * detector.energyFraction(energy_keV, cosine),
    energy_keV * energy_keV * detector.energySquareFraction(energy_keV, cosine),
    detector.efficiency(energy_keV, cosine),
  ];
}

/** E·(μen/ρ) of air on a grid of energies, keV cm²/g: air kerma per fluence up to a constant. */
export function airKermaPerFluence(energies_keV: Float64Array): Float64Array {
  const air = namedMaterial('air');
  if (!air) return new Float64Array(energies_keV.length);
  return massEnergyAbsorptionOn(air, energies_keV).map((value, i) => value * energies_keV[i]);
}

const angleCount = 48;
const halfPi = Math.PI / 2;
/** Cosine that stands for grazing incidence, where photons no longer leave the stack. */
const grazingCosine = 1e-3;

/**
 * Scores over the fine energies and 48 angles β ∝ j² (dense near the normal, where the grid's
 * transmission falls): `values[(energy · 48 + angle) · width + score]`. With a grid, scores 4–7
 * repeat 0–3 times its transmission. The last score is the photon's energy itself, E.
 */
export interface ScoreTable {
  readonly values: Float64Array;
  readonly width: number;
}

/** Place of an angle β among the table's angles. */
export const anglePlace = (beta: number): number => Math.sqrt(beta / halfPi) * (angleCount - 1);
export const scoreAngles = angleCount;
/** The table's angles, rad; the last stands at grazing incidence, where nothing leaves the stack. */
export const scoreBetas_rad = Float64Array.from({ length: angleCount }, (_, j) =>
  Math.min(Math.acos(grazingCosine), halfPi * (j / (angleCount - 1)) ** 2),
);

interface KeptTable {
  readonly nodes: EnergyNodes;
  readonly table: ScoreTable;
}

const made = new WeakMap<ScatterDetector, WeakMap<object, KeptTable>>();
const noGrid = {};

/** The score table of a detector and a grid; kept for the last nodes asked of each pair. */
export function scoreTable(
  detector: ScatterDetector,
  grid: ScatterGrid | null,
  nodes: EnergyNodes,
): ScoreTable {
  const byGrid = kept(made, detector, () => new WeakMap<object, KeptTable>());
  const last = byGrid.get(grid ?? noGrid);
  if (last?.nodes === nodes) return last.table;
  const table = tabulate(detector, grid, nodes.fine_keV);
  byGrid.set(grid ?? noGrid, { nodes, table });
  return table;
}

function tabulate(
  detector: ScatterDetector,
  grid: ScatterGrid | null,
  energies_keV: Float64Array,
): ScoreTable {
  const width = (grid ? 2 * scoreCount : scoreCount) + 1;
  const values = new Float64Array(energies_keV.length * angleCount * width);
  const airKerma = airKermaPerFluence(energies_keV);
  let at = 0;
  energies_keV.forEach((energy, i) => {
    for (let j = 0; j < angleCount; j++, at += width) {
      const cosine = Math.cos(scoreBetas_rad[j]);
      values.set(photonScores(detector, energy, cosine), at);
      values[at + airKermaScore] = airKerma[i];
      values[at + width - 1] = energy;
      if (!grid) continue;
      const transmission = grid.lookup(energy, cosine);
      for (let score = 0; score < scoreCount; score++) {
        values[at + scoreCount + score] = values[at + score] * transmission;
      }
    }
  });
  return { values, width };
}
