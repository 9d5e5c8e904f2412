import { type Material, massAttenuationOn } from '../../materials/index.js';
import { type Spectrum, withFluence } from './spectrum.js';

/** A slab of matter in the beam, normal to it. */
export interface MaterialLayer {
  readonly material: Material;
  readonly thickness_mm: number;
}

/**
 * The beam behind layers, narrow-beam geometry: Φ·exp(−Σ μᵢtᵢ) in every channel (Beer–Lambert).
 *
 * @param layers in any order, thickness ≥ 0
 * @returns the same channels; the same spectrum when there are no layers
 */
export function attenuate(spectrum: Spectrum, layers: readonly MaterialLayer[]): Spectrum {
  if (layers.length === 0) return spectrum;
  const depth = opticalDepth(spectrum.energies_keV, layers);
  const fluence = spectrum.fluence_per_mm2;
  for (let i = 0; i < depth.length; i++) depth[i] = fluence[i] * Math.exp(-depth[i]);
  return withFluence(spectrum, depth);
}

/** Σ μᵢtᵢ of the layers at every energy (a fresh array). */
export function opticalDepth(
  energies_keV: Float64Array,
  layers: readonly MaterialLayer[],
): Float64Array {
  const depth = new Float64Array(energies_keV.length);
  for (const { material, thickness_mm } of layers) {
    const coefficients = massAttenuationOn(material, energies_keV);
    const arealDensity_g_per_cm2 = (material.density_g_per_cm3 * thickness_mm) / 10;
    for (let i = 0; i < depth.length; i++) depth[i] += coefficients[i] * arealDensity_g_per_cm2;
  }
  return depth;
}
