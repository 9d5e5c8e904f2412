import { binCount, type Spectrum } from './spectrum.js';

/** One row of a spectrum as it is printed, exported and drawn. */
export interface SpectrumRow {
  readonly energy_keV: number;
  readonly fluence_per_mm2_per_keV_per_mAs: number;
}

/**
 * A spectrum as rows per keV. Tube lines are counted in the bin they fall into, so that the rows hold
 * every photon; a beam of lines only is given as if each line were 1 keV wide.
 *
 * @param spectrum photons per mm² and mAs
 */
export function spectrumRows(spectrum: Spectrum): SpectrumRow[] {
  const { edges_keV, energies_keV, fluence_per_mm2 } = spectrum;
  const bins = binCount(spectrum);
  if (bins === 0) {
    return Array.from(energies_keV, (energy_keV, i) => ({
      energy_keV,
      fluence_per_mm2_per_keV_per_mAs: fluence_per_mm2[i],
    }));
  }
  const counts = fluence_per_mm2.slice(0, bins);
  for (let line = bins; line < energies_keV.length; line++) {
    const above = edges_keV.findIndex((edge) => edge > energies_keV[line]);
    counts[above < 1 ? bins - 1 : above - 1] += fluence_per_mm2[line];
  }
  return Array.from(counts, (count, i) => ({
    energy_keV: energies_keV[i],
    fluence_per_mm2_per_keV_per_mAs: count / (edges_keV[i + 1] - edges_keV[i]),
  }));
}
