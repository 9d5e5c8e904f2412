import { type Material, massEnergyAbsorptionOn } from '../../materials/index.js';
import { nodeEnergies_keV, nodesPerKeV } from './energy-nodes.js';

/** E·(μen/ρ) of air at the energy nodes, keV cm²/g: kerma per unit fluence, up to a constant. */
export function airKermaTable(air: Material): Float64Array {
  return massEnergyAbsorptionOn(air, nodeEnergies_keV).map(
    (absorption, n) => absorption * nodeEnergies_keV[n],
  );
}

/** Reads the table between nodes. */
export function airKermaAt(table: Float64Array, energy_keV: number): number {
  const at = energy_keV * nodesPerKeV;
  const node = at | 0;
  return table[node] + (at - node) * (table[node + 1] - table[node]);
}
