import { electronRestEnergy_keV } from './constants.js';

/** Scattered energy over incident energy of a photon Compton-scattered by a free electron at rest. */
export function comptonEnergyRatio(energy_keV: number, cosTheta: number): number {
  return 1 / (1 + (energy_keV / electronRestEnergy_keV.value) * (1 - cosTheta));
}

/**
 * Shape of the Klein–Nishina cross section per solid angle (Klein & Nishina 1929), in units of r_e²/2:
 * k²(k + 1/k − sin²θ) with k the energy ratio; 1 + cos²θ in the limit of low energy.
 */
export function kleinNishinaShape(energy_keV: number, cosTheta: number): number {
  const k = comptonEnergyRatio(energy_keV, cosTheta);
  return k * k * (k + 1 / k - 1 + cosTheta * cosTheta);
}
