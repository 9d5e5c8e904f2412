import { massAttenuationOn, namedMaterial } from '../../materials/index.js';
import { type ReadoutWeights, Row } from './readout-weights.js';

const iterations = 200;

/**
 * Areal density of iodine that would give the same subject contrast in the same beam and detector,
 * laid on the reference background and displacing nothing: Σ S_i exp(−μ_I σ)/Σ S_i = 1 − C.
 *
 * ln of the left side is convex and falls with σ, so Newton's method from σ = 0 climbs to the root
 * without overshooting.
 *
 * @returns mg/cm²; null for a contrast that iodine cannot give (negative, or nothing left).
 */
export const iodineEquivalent_mg_per_cm2 = (
  { rows, channels }: ReadoutWeights,
  energies_keV: Float64Array,
  fluence_per_mm2: Float64Array,
  subjectContrast: number,
): number | null => {
  const iodine = namedMaterial('iodine');
  if (!iodine || !(subjectContrast >= 0 && subjectContrast < 1)) return null;
  const attenuation = massAttenuationOn(iodine, energies_keV);
  const from = Row.primary * channels;
  let background = 0;
  for (let i = 0; i < channels; i++) background += rows[from + i] * fluence_per_mm2[i];
  if (!(background > 0)) return null;
  const wanted = Math.log1p(-subjectContrast);
  let density_g_per_cm2 = 0;
  for (let step = 0; step < iterations; step++) {
    let signal = 0;
    let slope = 0;
    for (let i = 0; i < channels; i++) {
      const part =
        rows[from + i] * fluence_per_mm2[i] * Math.exp(-attenuation[i] * density_g_per_cm2);
      signal += part;
      slope += part * attenuation[i];
    }
    const change = ((Math.log(signal / background) - wanted) * signal) / slope;
    if (!Number.isFinite(change)) return null;
    density_g_per_cm2 += change;
    if (Math.abs(change) <= 1e-12 * density_g_per_cm2) break;
  }
  return 1000 * Math.max(0, density_g_per_cm2);
};
