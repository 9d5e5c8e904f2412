import { massEnergyAbsorptionOn } from '../../materials/index.js';
import { referenceMaterial } from '../beam/reference-materials.js';
import type { Spectrum } from '../beam/spectrum.js';

/**
 * Backscatter factor: air kerma at the skin with the patient there over that without, from the
 * monoenergetic back-face response weighted by the incident air-kerma spectrum.
 *
 * @param backscatter backscattered over incident air kerma (B − 1) on the channels of `skin`.
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
