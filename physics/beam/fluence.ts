import type { Spectrum } from './spectrum.js';

/** Photons per mm² in all channels. */
export const totalFluence_per_mm2 = ({ fluence_per_mm2 }: Spectrum): number =>
  fluence_per_mm2.reduce((sum, fluence) => sum + fluence, 0);

/** Energy fluence in keV per mm². */
export const energyFluence_keV_per_mm2 = ({ energies_keV, fluence_per_mm2 }: Spectrum): number =>
  fluence_per_mm2.reduce((sum, fluence, i) => sum + fluence * energies_keV[i], 0);

/** Mean photon energy weighted by fluence; 0 for an empty beam. */
export function meanEnergy_keV(spectrum: Spectrum): number {
  const fluence = totalFluence_per_mm2(spectrum);
  return fluence > 0 ? energyFluence_keV_per_mm2(spectrum) / fluence : 0;
}

/** Mean photon energy weighted by energy fluence, Σ ΦE²/Σ ΦE; 0 for an empty beam. */
export function energyWeightedMeanEnergy_keV(spectrum: Spectrum): number {
  const energyFluence = energyFluence_keV_per_mm2(spectrum);
  if (!(energyFluence > 0)) return 0;
  const { energies_keV, fluence_per_mm2 } = spectrum;
  const second = fluence_per_mm2.reduce((sum, f, i) => sum + f * energies_keV[i] ** 2, 0);
  return second / energyFluence;
}

/** The one energy of a beam that has only one, else null. */
export function soleEnergy_keV({ energies_keV, fluence_per_mm2 }: Spectrum): number | null {
  let sole: number | null = null;
  for (let i = 0; i < energies_keV.length; i++) {
    if (!(fluence_per_mm2[i] > 0)) continue;
    if (sole !== null && sole !== energies_keV[i]) return null;
    sole = energies_keV[i];
  }
  return sole;
}
