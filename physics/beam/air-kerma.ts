import { joulePerKeV, massEnergyAbsorptionOn } from '../../materials/index.js';
import { referenceMaterial } from './reference-materials.js';
import type { Spectrum } from './spectrum.js';

/** 1 keV/g in gray. */
const gray_per_keV_per_g = joulePerKeV.value / 1e-3;
const mm2_per_cm2 = 100;
const microgray_per_gray = 1e6;
const kermaScale = gray_per_keV_per_g * mm2_per_cm2 * microgray_per_gray;

const kept = new WeakMap<Float64Array, Float64Array>();

/**
 * Air kerma of one photon per mm² at each energy, µGy·mm²: E·(μen/ρ)air. Kept by identity of the
 * energies.
 *
 * @throws above 3 MeV, where μen/ρ is not known
 */
export function airKermaPerPhoton_uGy_mm2(energies_keV: Float64Array): Float64Array {
  let weights = kept.get(energies_keV);
  if (!weights) {
    const absorption = massEnergyAbsorptionOn(referenceMaterial('air'), energies_keV);
    weights = absorption.map((coefficient, i) => kermaScale * energies_keV[i] * coefficient);
    kept.set(energies_keV, weights);
  }
  return weights;
}

/**
 * Air kerma of a beam in µGy, per whatever its fluence is per (mAs, frame): K = Σ Φ E (μen/ρ)air,
 * bremsstrahlung losses neglected.
 *
 * @throws above 3 MeV
 */
export function airKerma_uGy({ energies_keV, fluence_per_mm2 }: Spectrum): number {
  const weights = airKermaPerPhoton_uGy_mm2(energies_keV);
  let kerma = 0;
  for (let i = 0; i < weights.length; i++) kerma += weights[i] * fluence_per_mm2[i];
  return kerma;
}

/** Air kerma where scatter adds to a narrow beam: K·(1 + SPR), the build-up of a broad beam. */
export const broadBeamAirKerma_uGy = (
  narrowBeam_uGy: number,
  scatterToPrimaryRatio: number,
): number => narrowBeam_uGy * (1 + scatterToPrimaryRatio);
