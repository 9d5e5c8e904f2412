import { massEnergyAbsorptionOn } from '../../materials/index.js';
import { referenceMaterial } from '../beam/reference-materials.js';
import type { Spectrum } from '../beam/spectrum.js';

/**
 * Backscatter factor B: air kerma of all photons at the skin with the patient there over incident air
 * kerma, from the monoenergetic response weighted by the incident air-kerma spectrum.
 *
 * Incident air kerma is of the primary alone, behind table and pad. Without a support B is the factor
 * of published tables. Behind one it also holds what the support scatters forward onto the skin, so
 * that B times incident air kerma is all the skin receives. A meter behind the table with no patient
 * reads primary and forward scatter, a few percent more than the incident air kerma meant here.
 *
 * @param backscatter scattered over incident air kerma (B − 1) on the channels of `skin`.
 */
export const backscatterFactor = (skin: Spectrum, backscatter: Float64Array): number => {
  const inAir = massEnergyAbsorptionOn(referenceMaterial('air'), skin.energies_keV);
  let back = 0;
  let incident = 0;
  for (let i = 0; i < inAir.length; i++) {
    const kerma = skin.fluence_per_mm2[i] * skin.energies_keV[i] * inAir[i];
    incident += kerma;
    back += kerma * backscatter[i];
  }
  return incident > 0 ? 1 + back / incident : 1;
};
