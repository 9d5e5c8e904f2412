import { kernelOf } from './adjoint/kernel.js';
import { meshOf } from './adjoint/mesh.js';
import { solveAdjoint } from './adjoint/solve.js';
import { emptySources, scoreAtExit } from './adjoint/sources.js';
import type { EnergyNodes } from './energy-nodes.js';
import { firstOrder } from './first-order.js';
import { broadened, type ScatterGeometry } from './geometry.js';
import { fieldShares } from './multiple-share.js';
import { airKermaPerFluence, airKermaScore, type ScatterDetector, scoreTable } from './scores.js';
import type { Slab } from './slabs.js';

/** Air kerma of what slabs scatter onto the plane behind them over that of the primary there. */
export interface ForwardScatter {
  /** On the axis of the field. */
  readonly here: Float64Array;
  /** In a parallel field without end. */
  readonly broad: Float64Array;
}

/** Air kerma asks nothing of a detector. */
const anyDetector: ScatterDetector = {
  efficiency: () => 1,
  energyFraction: () => 1,
  energySquareFraction: () => 1,
  edges_keV: [],
};

/**
 * What a support alone scatters forward, over the nodes: as the estimate of the detector's scatter,
 * exact first order and the field's share of multiple scatter. `broad` is all of one discretisation,
 * so that it can be taken from another solution of the same.
 *
 * @param geometry the field where the slabs end, as if the detector stood there.
 */
export function forwardScatter(
  slabs: readonly Slab[],
  geometry: ScatterGeometry,
  nodes: EnergyNodes,
): ForwardScatter {
  const energies = nodes.energies_keV;
  const table = scoreTable(anyDetector, null, nodes);
  const here = firstOrder(slabs, geometry, nodes, table);
  const broad = firstOrder(slabs, broadened(geometry), nodes, table);
  const share = fieldShares({ slabs, geometry, nodes, table, grid: null }, here, broad);
  const kernels = slabs.map(({ material }) => kernelOf(material, energies));
  const sources = emptySources(energies.length, 1);
  scoreAtExit(sources, 0, airKermaPerFluence(energies));
  const { total, uncollided, first } = solveAdjoint(meshOf(slabs), kernels, energies, sources);
  return {
    here: energies.map((_, i) => {
      const multiple = Math.max(0, (total[i] - uncollided[i] - first[i]) / uncollided[i]);
      return (
        here.compton[airKermaScore][i] +
        here.rayleigh[airKermaScore][i] +
        share[airKermaScore][i] * multiple
      );
    }),
    broad: energies.map((_, i) => total[i] / uncollided[i] - 1),
  };
}
