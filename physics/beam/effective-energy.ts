import { massAttenuation, massAttenuationOn } from '../../materials/index.js';
import { findRoot } from '../numeric/find-root.js';
import { soleEnergy_keV } from './fluence.js';
import { halfValueLayer_mm } from './half-value-layer.js';
import { referenceMaterial } from './reference-materials.js';
import type { Spectrum } from './spectrum.js';

// Aluminium attenuates less and less from its K edge (1.6 keV) to 20 MeV, so the answer is unique.
const lowest_keV = 2;
const highest_keV = 20_000;
const nodes = 200;
const nodeEnergies_keV = Float64Array.from(
  { length: nodes + 1 },
  (_, i) => lowest_keV * (highest_keV / lowest_keV) ** (i / nodes),
);

/**
 * The one photon energy whose half-value layer in aluminium is `halfValueLayer_mmAl`; null outside
 * 2 keV to 20 MeV.
 */
export function energyOfHalfValueLayer_keV(halfValueLayer_mmAl: number): number | null {
  const aluminium = referenceMaterial('aluminium');
  const wanted = (10 * Math.LN2) / (halfValueLayer_mmAl * aluminium.density_g_per_cm3);
  const above = massAttenuationOn(aluminium, nodeEnergies_keV).findIndex((m) => m <= wanted);
  if (above < 1) return null;
  const excess = (lnE: number) => Math.log(massAttenuation(aluminium, Math.exp(lnE)) / wanted);
  const [from, to] = [nodeEnergies_keV[above - 1], nodeEnergies_keV[above]];
  const lnE = findRoot(excess, Math.log(from), Math.log(to), 1e-12);
  return lnE === null ? null : Math.exp(lnE);
}

/** Effective energy of a beam: that of one energy with the same first half-value layer in aluminium. */
export function effectiveEnergy_keV(spectrum: Spectrum): number | null {
  const sole = soleEnergy_keV(spectrum);
  if (sole !== null) return sole;
  const first_mm = halfValueLayer_mm(spectrum, referenceMaterial('aluminium'));
  return first_mm === null ? null : energyOfHalfValueLayer_keV(first_mm);
}
