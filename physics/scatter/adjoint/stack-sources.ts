import { gaussLegendre } from '../../numeric/gauss-legendre.js';
import {
  airKermaPerFluence,
  photonScores,
  type ScatterDetector,
  type ScatterGrid,
  scoreCount,
} from '../scores.js';
import type { Slab } from '../slabs.js';
import { cosines, ordinateCell, ordinates, ray, rows } from './directions.js';
import { type AdjointSources, emptySources, scoreAtSkin } from './sources.js';

/**
 * The responses of one stack, side by side: the four detector scores, with a grid the same four behind
 * it, then scattered air kerma at the skin, then energy left in each slab of the patient.
 */
export interface StackSources {
  readonly sources: AdjointSources;
  readonly detectorScores: number;
  readonly backscatter: number;
  /** Response of each layer of the stack; −1 for a layer without thickness. */
  readonly layers: readonly number[];
}

export function stackSources(
  slabs: readonly Slab[],
  layerCount: number,
  energies_keV: Float64Array,
  detector: ScatterDetector,
  grid: ScatterGrid | null,
): StackSources {
  const detectorScores = grid ? 2 * scoreCount : scoreCount;
  const backscatter = detectorScores;
  let width = backscatter + 1;
  const layers = Array.from({ length: layerCount }, (_, layer) =>
    slabs.some(({ layerIndex }) => layerIndex === layer) ? width++ : -1,
  );
  const sources = emptySources(energies_keV.length, width);
  const airKerma = airKermaPerFluence(energies_keV);
  energies_keV.forEach((energy, i) => {
    for (let d = 0; d < rows; d++) {
      const scores = [...photonScores(detector, energy, cosines[d]), airKerma[i] / cosines[d]];
      const transmission = grid ? cellTransmission(grid, energy, d) : 0;
      scores.forEach((score, r) => {
        sources.exit[(i * width + r) * rows + d] = score;
        if (grid) sources.exit[(i * width + scoreCount + r) * rows + d] = score * transmission;
      });
    }
  });
  scoreAtSkin(sources, backscatter, airKerma);
  layers.forEach((response, layer) => {
    if (response >= 0) sources.slab[response] = slabs.findIndex((s) => s.layerIndex === layer);
  });
  return { sources, detectorScores, backscatter, layers };
}

const cellPoints = gaussLegendre(ordinates);

/** The grid's transmission averaged over the μ an ordinate stands for; a point value is 5–10 % low. */
function cellTransmission(grid: ScatterGrid, energy_keV: number, direction: number): number {
  if (direction === ray) return grid.lookup(energy_keV, 1);
  const [from, to] = ordinateCell(direction);
  return cellPoints.nodes.reduce(
    (sum, node, k) =>
      sum + cellPoints.weights[k] * grid.lookup(energy_keV, from + (to - from) * node),
    0,
  );
}
