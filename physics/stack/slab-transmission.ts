import { kept } from '../../materials/kept.js';
import { type MaterialLayer, opticalDepth } from '../beam/attenuate.js';

const known = new WeakMap<readonly MaterialLayer[], WeakMap<Float64Array, Float64Array>>();

/**
 * Narrow-beam transmission Π exp(−μᵢtᵢ) of a list of slabs at every energy (Beer–Lambert).
 *
 * Kept per list and grid by identity: a sweep over filters pays for the patient's exponentials once
 * per potential. Neither may be changed after.
 *
 * @returns 1 at every energy for an empty list; shared, not to be written to.
 */
export const slabTransmissionOn = (
  slabs: readonly MaterialLayer[],
  energies_keV: Float64Array,
): Float64Array =>
  kept(
    kept(known, slabs, () => new WeakMap<Float64Array, Float64Array>()),
    energies_keV,
    () => opticalDepth(energies_keV, slabs).map((depth) => Math.exp(-depth)),
  );
