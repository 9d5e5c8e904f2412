import { airKerma_uGy } from './air-kerma.js';
import { totalFluence_per_mm2 } from './fluence.js';
import type { Spectrum } from './spectrum.js';

/**
 * Squared signal-to-noise ratio per air kerma of an ideal photon counter, 1/(mm²·µGy): by Poisson
 * statistics the fluence itself (IEC 62220-1-1, SNR²in). Null for an empty beam.
 */
export function idealSnrSquaredPerAirKerma_per_mm2_uGy(spectrum: Spectrum): number | null {
  const kerma = airKerma_uGy(spectrum);
  return kerma > 0 ? totalFluence_per_mm2(spectrum) / kerma : null;
}
