import { binCount, type Spectrum } from '../../physics/beam/index.js';

/** One bin of a spectrum: its middle, its bounds, and photons per keV with the lines inside it. */
export interface SpectrumRow {
  readonly energy_keV: number;
  readonly fluence_per_mm2_per_keV_per_mAs: number;
  readonly from_keV: number;
  readonly to_keV: number;
}

/**
 * A spectrum as rows of fluence per keV. A line has no width of its own, so its photons are spread
 * over the bin it falls into: fluence × (to − from), summed, is the whole fluence.
 */
export const spectrumRows = (spectrum: Spectrum): SpectrumRow[] => {
  const { edges_keV, energies_keV, fluence_per_mm2 } = spectrum;
  const bins = binCount(spectrum);
  const photons = fluence_per_mm2.slice(0, bins);
  for (let line = bins; line < energies_keV.length; line++) {
    photons[binOf(edges_keV, energies_keV[line])] += fluence_per_mm2[line];
  }
  return Array.from(photons, (fluence, i) => ({
    energy_keV: energies_keV[i],
    fluence_per_mm2_per_keV_per_mAs: fluence / (edges_keV[i + 1] - edges_keV[i]),
    from_keV: edges_keV[i],
    to_keV: edges_keV[i + 1],
  }));
};

const binOf = (edges_keV: Float64Array, energy_keV: number): number => {
  const above = edges_keV.findIndex((edge) => edge > energy_keV);
  return above < 0 ? edges_keV.length - 2 : Math.max(0, above - 1);
};
