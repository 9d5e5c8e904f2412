import type { Material } from '../../materials/index.js';
import { kept } from '../../materials/kept.js';
import { rowPositions, shapeIntegrals } from './angle-quantiles.js';
import { nodesPerKeV } from './energy-nodes.js';
import {
  comptonShape,
  rayleighShape,
  type ScatteringShape,
  scatteringShape,
} from './scattering-shape.js';

/** What forced detection needs of a material: shapes and their ∫ dΩ at the energy nodes. */
export interface AngleDensity {
  readonly shape: ScatteringShape;
  readonly comptonIntegral: Float64Array;
  readonly rayleighIntegral: Float64Array;
}

const densities = new WeakMap<Material, AngleDensity>();

export const angleDensity = (material: Material): AngleDensity =>
  kept(densities, material, () => {
    const shape = scatteringShape(material);
    return {
      shape,
      comptonIntegral: onNodes(shapeIntegrals((E, cosTheta) => comptonShape(shape, E, cosTheta))),
      rayleighIntegral: onNodes(shapeIntegrals((E, cosTheta) => rayleighShape(shape, E, cosTheta))),
    };
  });

/** Probability per sr that a Compton-scattered photon goes on at cosθ. */
export const comptonDensity = (density: AngleDensity, energy_keV: number, cosTheta: number) =>
  comptonShape(density.shape, energy_keV, cosTheta) / between(density.comptonIntegral, energy_keV);

/** Probability per sr that a Rayleigh-scattered photon goes on at cosθ. */
export const rayleighDensity = (density: AngleDensity, energy_keV: number, cosTheta: number) =>
  rayleighShape(density.shape, energy_keV, cosTheta) /
  between(density.rayleighIntegral, energy_keV);

// From row energies to energy nodes, as powers of the energy.
function onNodes(integrals: Float64Array): Float64Array {
  const logs = integrals.map(Math.log);
  return rowPositions.map((position) => {
    const row = Math.min(logs.length - 2, Math.floor(position));
    return Math.exp(logs[row] + (position - row) * (logs[row + 1] - logs[row]));
  });
}

function between(table: Float64Array, energy_keV: number): number {
  const at = energy_keV * nodesPerKeV;
  const node = at | 0;
  return table[node] + (at - node) * (table[node + 1] - table[node]);
}
