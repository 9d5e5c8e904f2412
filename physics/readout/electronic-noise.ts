import { kept } from '../../materials/kept.js';
import { airKerma_uGy } from '../beam/index.js';
import { referenceBeam } from '../beam/reference-beam.js';
import type { Spectrum } from '../beam/spectrum.js';
import type { Detector } from '../case/schema.js';
import type { DetectorResponse } from './detector-response.js';

/**
 * Quantum variance of detector signal per mm²: Σ Φ E² ε₂ over the optical Swank factor, in signal
 * units squared (keV² when integrating, counts when counting), for the fluence given.
 */
export const quantumVariance_per_mm2 = (beam: Spectrum, response: DetectorResponse): number => {
  const { energies_keV, fluence_per_mm2 } = beam;
  const { epsilon2 } = response.on(energies_keV);
  let variance = 0;
  for (let i = 0; i < energies_keV.length; i++) {
    variance += fluence_per_mm2[i] * energies_keV[i] * energies_keV[i] * epsilon2[i];
  }
  return variance / response.opticalSwank;
};

const known = new WeakMap<DetectorResponse, number>();

/**
 * Electronic noise variance per mm², constant in signal units: the quantum variance of the named
 * reference beam, without grid, at the detector air kerma the detector is described by (where the
 * two are equal). An ideal detector has none.
 */
export const electronicVariance_per_mm2 = (
  detector: Detector,
  response: DetectorResponse,
): number =>
  kept(known, response, () => {
    if (response.isIdeal || detector.electronicNoiseKerma_uGy === 0) return 0;
    const beam = referenceBeam(detector.electronicNoiseBeam);
    const perKerma = quantumVariance_per_mm2(beam, response) / airKerma_uGy(beam);
    return perKerma * detector.electronicNoiseKerma_uGy;
  });
