import { elementCoefficients } from './element-coefficients.js';
import { elementEnergyAbsorption, energyAbsorptionLimit_keV } from './energy-absorption.js';
import { kept } from './kept.js';

/** Coefficients of one element on an energy grid, cm²/g; μen/ρ is computed when first asked for. */
export interface ElementColumns {
  readonly coherent: Float64Array;
  readonly incoherent: Float64Array;
  readonly photoelectric: Float64Array;
  readonly massAttenuation: Float64Array;
  energyAbsorption(): Float64Array;
}

const columnsOfGrid = new WeakMap<Float64Array, Map<number, ElementColumns>>();

/** Columns of element z on a grid, kept per grid identity, so that a new mixture only sums columns. */
export function elementColumns(z: number, energies_keV: Float64Array): ElementColumns {
  const columns = kept(columnsOfGrid, energies_keV, () => new Map<number, ElementColumns>());
  return kept(columns, z, () => fillColumns(z, energies_keV));
}

function fillColumns(z: number, energies_keV: Float64Array): ElementColumns {
  const n = energies_keV.length;
  const coherent = new Float64Array(n);
  const incoherent = new Float64Array(n);
  const photoelectric = new Float64Array(n);
  const massAttenuation = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    const row = elementCoefficients(z, energies_keV[i]);
    coherent[i] = row.coherent_cm2_per_g;
    incoherent[i] = row.incoherent_cm2_per_g;
    photoelectric[i] = row.photoelectric_cm2_per_g;
    massAttenuation[i] = row.massAttenuation_cm2_per_g;
  }
  let absorption: Float64Array | undefined;
  return {
    coherent,
    incoherent,
    photoelectric,
    massAttenuation,
    energyAbsorption: () => (absorption ??= energies_keV.map((energy) => absorptionAt(z, energy))),
  };
}

function absorptionAt(z: number, energy_keV: number): number {
  if (energy_keV <= energyAbsorptionLimit_keV) return elementEnergyAbsorption(z, energy_keV);
  throw new RangeError(
    `energy_keV: ${energy_keV}: μen/ρ is given up to ${energyAbsorptionLimit_keV} keV; end the grid there`,
  );
}
