import type { Material } from '../../materials/index.js';
import type { BeamQuality, HalfValueLayers } from '../results.js';
import { airKerma_uGy } from './air-kerma.js';
import { energyOfHalfValueLayer_keV } from './effective-energy.js';
import { meanEnergy_keV, soleEnergy_keV, totalFluence_per_mm2 } from './fluence.js';
import { referenceMaterial } from './reference-materials.js';
import type { Spectrum } from './spectrum.js';
import { valueLayers } from './value-layer.js';

/**
 * Everything one says about a beam: half- and tenth-value layers by air kerma in narrow-beam geometry
 * (aluminium first), homogeneity, mean and effective energy, air kerma and fluence per mAs.
 *
 * @param spectrum photons per mm² and mAs, at least one
 * @param potential_kV null for a beam without a tube
 * @param absorbers further materials to give half-value layers in; copper unless said
 */
export function beamQuality(
  spectrum: Spectrum,
  potential_kV: number | null = null,
  absorbers: readonly Material[] = [referenceMaterial('copper')],
): BeamQuality {
  const layers = [referenceMaterial('aluminium'), ...absorbers].map((m) =>
    halfValueLayers(spectrum, m),
  );
  const { first_mm, second_mm } = layers[0];
  const sole = soleEnergy_keV(spectrum);
  return {
    potential_kV,
    halfValueLayers: layers,
    homogeneityCoefficient: sole === null && first_mm && second_mm ? first_mm / second_mm : 1,
    meanEnergy_keV: meanEnergy_keV(spectrum),
    effectiveEnergy_keV: sole ?? (first_mm === null ? null : energyOfHalfValueLayer_keV(first_mm)),
    airKerma_uGy_per_mAs: airKerma_uGy(spectrum),
    fluence_per_mm2_per_mAs: totalFluence_per_mm2(spectrum),
  };
}

function halfValueLayers(spectrum: Spectrum, absorber: Material): HalfValueLayers {
  const { thicknesses_mm } = valueLayers(spectrum, absorber, [0.5, 0.25, 0.1]);
  if (!thicknesses_mm) {
    return { material: absorber.name, first_mm: null, second_mm: null, tenth_mm: null };
  }
  const [half, quarter, tenth] = thicknesses_mm;
  return { material: absorber.name, first_mm: half, second_mm: quarter - half, tenth_mm: tenth };
}
