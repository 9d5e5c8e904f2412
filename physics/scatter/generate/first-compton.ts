import { energyNodes } from '../energy-nodes.js';
import { fieldAxes } from '../field-axes.js';
import { firstOrder } from '../first-order.js';
import { airKermaScore, type ScatterDetector, scoreTable } from '../scores.js';
import { named } from './water-pencil.js';

const { energies_keV } = fieldAxes;

export interface ComptonScatter {
  readonly energy: readonly number[];
  readonly airKerma: readonly number[];
}

// As edges, the table's energies become nodes.
const nodes = energyNodes([...energies_keV]);
const detector: ScatterDetector = {
  efficiency: () => 1,
  energyFraction: () => 1,
  energySquareFraction: () => 1,
  edges_keV: [],
};
const table = scoreTable(detector, null, nodes);
const places = energies_keV.map((energy) => nodes.energies_keV.indexOf(energy));

/**
 * First-order Compton scatter over primary behind water in a parallel beam, at the table's energies: of
 * energy, and of air kerma.
 */
export function firstCompton(
  thickness_cm: number,
  gap_cm: number,
  halfSide_cm: number,
): ComptonScatter {
  const slab = { material: named('water'), thickness_cm, layerIndex: 0 };
  const geometry = { beam: 'parallel', sourceToDetector_cm: 100, gap_cm, halfSide_cm } as const;
  const { compton } = firstOrder([slab], geometry, nodes, table);
  const at = (score: number) => places.map((place) => compton[score][place]);
  return { energy: at(0), airKerma: at(airKermaScore) };
}
