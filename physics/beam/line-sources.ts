import { boundedMemo } from '../numeric/bounded-memo.js';
import type { Spectrum } from './spectrum.js';

const channelsKept = 64;
const noBins = new Float64Array(0);

// Energies keep their identity, so that coefficients remembered by it are found again.
const channels = boundedMemo<readonly number[], Float64Array>(
  channelsKept,
  (energies) => energies.join(),
  (energies) => Float64Array.from(energies),
);

/**
 * A beam of exact photon energies, as of a gamma source.
 *
 * @param lines energy in keV (5 to 20 000) and photons per mm² (per mAs where that has a meaning), in
 *   any order; equal energies add up, and what is not positive is left out
 */
export function lineSpectrum(lines: readonly (readonly [number, number])[]): Spectrum {
  const byEnergy = new Map<number, number>();
  for (const [energy_keV, fluence] of lines) {
    if (!(fluence > 0)) continue;
    byEnergy.set(energy_keV, (byEnergy.get(energy_keV) ?? 0) + fluence);
  }
  const energies = [...byEnergy.keys()].sort((a, b) => a - b);
  return {
    edges_keV: noBins,
    energies_keV: channels(energies),
    fluence_per_mm2: Float64Array.from(energies, (energy) => byEnergy.get(energy) ?? 0),
  };
}

/** A beam of one photon energy. */
export const monoenergetic = (energy_keV: number, fluence_per_mm2 = 1): Spectrum =>
  lineSpectrum([[energy_keV, fluence_per_mm2]]);
