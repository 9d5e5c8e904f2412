import { type Material, massAttenuation, massAttenuationOn } from '../../materials/index.js';
import { airKermaPerPhoton_uGy_mm2 } from './air-kerma.js';
import { soleEnergy_keV } from './fluence.js';
import type { Spectrum } from './spectrum.js';

/** Thicknesses of an absorber, or why there are none. */
export type ValueLayers =
  | { readonly thicknesses_mm: readonly number[]; readonly reason: null }
  | { readonly thicknesses_mm: null; readonly reason: string };

const tolerance = 1e-12;
const maxSteps = 100;

/**
 * Thicknesses of `absorber` that let through the given shares of air kerma in narrow-beam geometry.
 *
 * Newton's method on ln K(t): K is a sum of falling exponentials, so ln K is convex and the steps
 * from a thinner absorber approach the root from below without overshoot. A beam of one energy is
 * answered in closed form, ln(1/T)/μ, also above 3 MeV.
 *
 * @param transmissions shares of air kerma, each above 0 and at most 1, falling
 * @returns thicknesses in mm, or the reason why they cannot be had (no photons, energies above
 *   3 MeV, an absorber without mass)
 */
export function valueLayers(
  spectrum: Spectrum,
  absorber: Material,
  transmissions: readonly number[],
): ValueLayers {
  const sole = soleEnergy_keV(spectrum);
  if (sole !== null) {
    const perMm = (massAttenuation(absorber, sole) * absorber.density_g_per_cm3) / 10;
    if (!(perMm > 0)) return unreachable(`${absorber.name} does not attenuate`);
    return { thicknesses_mm: transmissions.map((t) => -Math.log(t) / perMm), reason: null };
  }
  return polyenergeticLayers(spectrum, absorber, transmissions);
}

const unreachable = (reason: string): ValueLayers => ({ thicknesses_mm: null, reason });

function polyenergeticLayers(
  spectrum: Spectrum,
  absorber: Material,
  transmissions: readonly number[],
): ValueLayers {
  const { energies_keV, fluence_per_mm2 } = spectrum;
  if (energies_keV.some((energy, i) => energy > 3000 && fluence_per_mm2[i] > 0)) {
    return unreachable('air kerma is not known above 3000 keV');
  }
  const perPhoton = airKermaPerPhoton_uGy_mm2(energies_keV);
  const kerma = fluence_per_mm2.map((fluence, i) => fluence * perPhoton[i]);
  const total = kerma.reduce((sum, k) => sum + k, 0);
  if (!(total > 0)) return unreachable('the beam holds no photons');
  const coefficients = massAttenuationOn(absorber, energies_keV);
  const perMm = absorber.density_g_per_cm3 / 10;
  if (!(perMm > 0)) return unreachable(`${absorber.name} does not attenuate`);

  let thickness_mm = 0;
  const thicknesses: number[] = [];
  for (const transmission of transmissions) {
    const target = Math.log(transmission * total);
    for (let step = 0; step < maxSteps; step++) {
      let remaining = 0;
      let slope = 0;
      for (let i = 0; i < kerma.length; i++) {
        const k = kerma[i] * Math.exp(-coefficients[i] * perMm * thickness_mm);
        remaining += k;
        slope += k * coefficients[i];
      }
      const change = ((Math.log(remaining) - target) * remaining) / (slope * perMm);
      thickness_mm += change;
      if (Math.abs(change) <= tolerance * thickness_mm) break;
    }
    thicknesses.push(thickness_mm);
  }
  return { thicknesses_mm: thicknesses, reason: null };
}

/** Thickness in mm that lets `transmission` of the air kerma through; null where it cannot be had. */
export const valueLayer_mm = (
  spectrum: Spectrum,
  absorber: Material,
  transmission: number,
): number | null => valueLayers(spectrum, absorber, [transmission]).thicknesses_mm?.[0] ?? null;
