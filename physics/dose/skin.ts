import { type Material, massEnergyAbsorptionOn } from '../../materials/index.js';
import { referenceMaterial } from '../beam/reference-materials.js';
import type { Spectrum } from '../beam/spectrum.js';

/**
 * Ratio of (μen/ρ) of skin to that of air, weighted by the incident energy fluence times air's:
 * turns entrance surface air kerma into skin absorbed dose under charged-particle equilibrium.
 * The backscattered photons are given the incident beam's ratio (they are softer; the ratio of
 * skin to air varies by under 2 % between 30 and 100 keV).
 */
export const skinToAirRatio = (skin: Spectrum, skinTissue: Material): number => {
  const inSkin = massEnergyAbsorptionOn(skinTissue, skin.energies_keV);
  const inAir = massEnergyAbsorptionOn(referenceMaterial('air'), skin.energies_keV);
  let above = 0;
  let below = 0;
  for (let i = 0; i < inAir.length; i++) {
    const energyFluence = skin.fluence_per_mm2[i] * skin.energies_keV[i];
    above += energyFluence * inSkin[i];
    below += energyFluence * inAir[i];
  }
  return below > 0 ? above / below : 0;
};
