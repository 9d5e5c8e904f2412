import {
  energyAbsorptionLimit_keV,
  type Material,
  massAttenuation,
  massAttenuationOn,
} from '../../materials/index.js';
import { airKermaPerPhoton_uGy_mm2 } from './air-kerma.js';
import { soleEnergy_keV } from './fluence.js';
import type { Spectrum } from './spectrum.js';

/** Thicknesses of an absorber, or why there are none. */
export type ValueLayers =
  | { readonly thicknesses_mm: readonly number[]; readonly reason: null }
  | { readonly thicknesses_mm: null; readonly reason: string };

// A step of Halley's method leaves about the cube of the step's relative size as error.
const lastStep = 1e-6;
const maxSteps = 100;

/**
 * Thicknesses of `absorber` that let through the given shares of air kerma in narrow-beam geometry.
 *
 * Halley's method on ln K(t), whose first two derivatives are the mean and the variance of μ over the
 * kerma still there: three or four passes over the channels for a half-value layer. A beam of one
 * energy is answered in closed form, ln(1/T)/μ, also above 3 MeV.
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
  if (
    energies_keV.some((energy, i) => energy > energyAbsorptionLimit_keV && fluence_per_mm2[i] > 0)
  ) {
    return unreachable(`air kerma is not known above ${energyAbsorptionLimit_keV} keV`);
  }
  const perMm = absorber.density_g_per_cm3 / 10;
  if (!(perMm > 0)) return unreachable(`${absorber.name} does not attenuate`);
  const perPhoton = airKermaPerPhoton_uGy_mm2(energies_keV);
  const kerma = new Float64Array(perPhoton.length);
  let total = 0;
  for (let i = 0; i < kerma.length; i++) {
    kerma[i] = fluence_per_mm2[i] * perPhoton[i];
    total += kerma[i];
  }
  if (!(total > 0)) return unreachable('the beam holds no photons');
  const coefficients = massAttenuationOn(absorber, energies_keV);

  let arealDensity_g_per_cm2 = 0;
  const thicknesses_mm = transmissions.map((transmission) => {
    const target = Math.log(transmission * total);
    arealDensity_g_per_cm2 = solve(kerma, coefficients, target, arealDensity_g_per_cm2);
    return arealDensity_g_per_cm2 / perMm;
  });
  return { thicknesses_mm, reason: null };
}

/** Areal density at which ln Σ kᵢ exp(−mᵢ t) is `target`, from a smaller one. */
function solve(
  kerma: Float64Array,
  massAttenuation_cm2_per_g: Float64Array,
  target: number,
  from_g_per_cm2: number,
): number {
  let t = from_g_per_cm2;
  for (let step = 0; step < maxSteps; step++) {
    let sum = 0;
    let first = 0;
    let second = 0;
    for (let i = 0; i < kerma.length; i++) {
      const m = massAttenuation_cm2_per_g[i];
      const k = kerma[i] * Math.exp(-m * t);
      sum += k;
      first += k * m;
      second += k * m * m;
    }
    const mean = first / sum;
    const variance = Math.max(0, second / sum - mean * mean);
    const newton = (Math.log(sum) - target) / mean;
    // Newton alone stays short of the root; Halley's factor is kept from overshooting far off it.
    const change = newton / (1 - Math.min(0.5, (newton * variance) / (2 * mean)));
    t = Math.max(0, t + change);
    if (Math.abs(change) <= lastStep * t) break;
  }
  return t;
}

/** Thickness in mm that lets `transmission` of the air kerma through; null where it cannot be had. */
export const valueLayer_mm = (
  spectrum: Spectrum,
  absorber: Material,
  transmission: number,
): number | null => valueLayers(spectrum, absorber, [transmission]).thicknesses_mm?.[0] ?? null;
