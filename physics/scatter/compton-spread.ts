import { comptonEnergyRatio } from '../../materials/index.js';
import { isEdge } from './energy-nodes.js';
import type { FirstOrder } from './first-order.js';

/** Compton scatter here over that in an infinite field, by score; 1 where there is none at all. */
export const comptonSpreads = (
  here: FirstOrder,
  infinite: FirstOrder,
  energies_keV: Float64Array,
): Float64Array[] =>
  here.compton.map((values, score) =>
    bridgeEdges(
      values.map((value, i) =>
        infinite.compton[score][i] > 0 ? value / infinite.compton[score][i] : 1,
      ),
      energies_keV,
    ),
  );

/**
 * Just above an edge first-order scatter is mostly what Compton scattering carries below the edge, at
 * large angles; multiple scatter, with the K lines, gets below it otherwise. Where scattering by 90°
 * crosses an edge the ratio below the edge stands.
 */
function bridgeEdges(ratios: Float64Array, energies_keV: Float64Array): Float64Array {
  const bridged = ratios.slice();
  for (let edge = 0; edge < ratios.length - 1; edge++) {
    if (!isEdge(energies_keV, edge)) continue;
    for (let i = edge + 1; i < ratios.length; i++) {
      if (energies_keV[i] * comptonEnergyRatio(energies_keV[i], 0) >= energies_keV[edge]) break;
      bridged[i] = bridged[edge];
    }
  }
  return bridged;
}
