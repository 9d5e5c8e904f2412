import { airKerma_uGy, attenuate, effectiveEnergy_keV, meanEnergy_keV } from '../beam/index.js';
import type { Spectrum } from '../beam/spectrum.js';
import type { LayerTransmission, Transmission } from '../results.js';
import type { Stack } from './stack.js';

/** What a meter would read of a beam three ways, and its mean energy. */
interface Content {
  readonly kerma: number;
  readonly number: number;
  readonly energy_keV: number;
}

const contentOf = (spectrum: Spectrum): Content => {
  const { energies_keV, fluence_per_mm2 } = spectrum;
  let number = 0;
  let energy_keV = 0;
  for (let i = 0; i < energies_keV.length; i++) {
    number += fluence_per_mm2[i];
    energy_keV += fluence_per_mm2[i] * energies_keV[i];
  }
  return { kerma: airKerma_uGy(spectrum), number, energy_keV };
};

const share = (part: number, whole: number): number => (whole > 0 ? part / whole : 0);

/**
 * How much of the beam at the skin each layer passes, narrow beam, inverse square removed: by air
 * kerma alone and from the skin on, and from the skin on by photon number and energy fluence, with
 * mean and effective energy at each layer's exit face.
 *
 * @param skin beam at the skin; any scale.
 * @returns shares of 0 to 1; energies in keV. Behind matter that passes nothing that can be
 * represented, shares and mean energy are 0 and effective energy is null.
 */
export const layerTransmission = (stack: Stack, skin: Spectrum): Transmission => {
  const entrance = contentOf(skin);
  const layers: LayerTransmission[] = [];
  let beam = skin;
  let before = entrance;
  for (const layer of stack.layers) {
    beam = attenuate(beam, [layer]);
    const after = contentOf(beam);
    const isDark = !(after.number > 0);
    layers.push({
      layer: layer.name,
      own: share(after.kerma, before.kerma),
      cumulative: share(after.kerma, entrance.kerma),
      meanEnergy_keV: isDark ? 0 : meanEnergy_keV(beam),
      effectiveEnergy_keV: isDark ? null : effectiveEnergy_keV(beam),
      cumulativeByNumber: share(after.number, entrance.number),
      cumulativeByEnergyFluence: share(after.energy_keV, entrance.energy_keV),
    });
    before = after;
  }
  return {
    primary: share(before.kerma, entrance.kerma),
    layers,
    exitMeanEnergy_keV: share(before.energy_keV, before.number),
  };
};
