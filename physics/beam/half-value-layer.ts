import type { Material } from '../../materials/index.js';
import { soleEnergy_keV } from './fluence.js';
import { referenceMaterial } from './reference-materials.js';
import type { Spectrum } from './spectrum.js';
import { valueLayer_mm, valueLayers } from './value-layer.js';

/**
 * The n-th half-value layer by air kerma, narrow beam, in mm: what halves the beam that n − 1 half-
 * value layers have left. Null for an empty beam.
 */
export function halfValueLayer_mm(spectrum: Spectrum, absorber: Material, n = 1): number | null {
  const { thicknesses_mm } = valueLayers(
    spectrum,
    absorber,
    n > 1 ? [2 ** (1 - n), 2 ** -n] : [0.5],
  );
  if (!thicknesses_mm) return null;
  return n > 1 ? thicknesses_mm[1] - thicknesses_mm[0] : thicknesses_mm[0];
}

/** Quarter-value layer: first plus second half-value layer. */
export const quarterValueLayer_mm = (spectrum: Spectrum, absorber: Material): number | null =>
  valueLayer_mm(spectrum, absorber, 0.25);

/** Tenth-value layer by air kerma, narrow beam. */
export const tenthValueLayer_mm = (spectrum: Spectrum, absorber: Material): number | null =>
  valueLayer_mm(spectrum, absorber, 0.1);

/** First over second half-value layer: exactly 1 for one energy, below 1 otherwise; null if empty. */
export function homogeneityCoefficient(
  spectrum: Spectrum,
  absorber: Material = referenceMaterial('aluminium'),
): number | null {
  if (soleEnergy_keV(spectrum) !== null) return 1;
  const { thicknesses_mm } = valueLayers(spectrum, absorber, [0.5, 0.25]);
  return thicknesses_mm && thicknesses_mm[0] / (thicknesses_mm[1] - thicknesses_mm[0]);
}

/** Effective linear attenuation coefficient ln2/HVL1, in cm⁻¹. */
export function effectiveAttenuation_per_cm(spectrum: Spectrum, absorber: Material): number | null {
  const first_mm = halfValueLayer_mm(spectrum, absorber);
  return first_mm === null ? null : (10 * Math.LN2) / first_mm;
}
