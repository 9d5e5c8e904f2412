import { pairThreshold_keV } from './constants.js';
import { elementTableOf } from './element-tables.js';
import { evaluate, type HermiteCurve, monotoneCubic, naturalSpline } from './interpolation.js';
import { kept } from './kept.js';

/** Energies the tables cover, keV. */
export const tabulatedEnergies_keV = { min: 1, max: 20_000 } as const;

/** Mass attenuation coefficients by process, cm²/g. */
export interface PartialCoefficients {
  readonly coherent_cm2_per_g: number;
  readonly incoherent_cm2_per_g: number;
  readonly photoelectric_cm2_per_g: number;
  readonly pair_cm2_per_g: number;
  readonly massAttenuation_cm2_per_g: number;
}

interface ElementCurves {
  readonly coherent: HermiteCurve;
  readonly incoherent: HermiteCurve;
  readonly photoelectric: HermiteCurve;
  readonly reducedPair: HermiteCurve;
}

const curves = new Map<number, ElementCurves>();

/**
 * Coefficients of element z at one energy (1 keV to 20 MeV), XCOM (Berger & Hubbell 1987).
 * Coherent and incoherent: natural cubic spline, log-log. Photoelectric: monotone cubic, log-log,
 * inside each edge segment; at an edge the upper value. Pair: κ/(1 − 2mc²/E)³ interpolated.
 */
export function elementCoefficients(z: number, energy_keV: number): PartialCoefficients {
  const { coherent, incoherent, photoelectric, reducedPair } = curvesOf(z);
  const logE = Math.log(requireTabulated(energy_keV));
  const coherent_cm2_per_g = Math.exp(evaluate(coherent, logE));
  const incoherent_cm2_per_g = Math.exp(evaluate(incoherent, logE));
  const photoelectric_cm2_per_g = Math.exp(evaluate(photoelectric, logE));
  const pair_cm2_per_g =
    energy_keV > pairThreshold_keV.value
      ? Math.exp(evaluate(reducedPair, logE)) * thresholdFactor(energy_keV)
      : 0;
  return {
    coherent_cm2_per_g,
    incoherent_cm2_per_g,
    photoelectric_cm2_per_g,
    pair_cm2_per_g,
    massAttenuation_cm2_per_g:
      coherent_cm2_per_g + incoherent_cm2_per_g + photoelectric_cm2_per_g + pair_cm2_per_g,
  };
}

function requireTabulated(energy_keV: number): number {
  const { min, max } = tabulatedEnergies_keV;
  if (energy_keV >= min && energy_keV <= max) return energy_keV;
  throw new RangeError(
    `energy_keV: ${energy_keV}: must be ${min} to ${max}; the attenuation tables end there`,
  );
}

// The steep rise above threshold, taken out before interpolating and put back after (XCOM's own way).
function thresholdFactor(energy_keV: number): number {
  return (1 - pairThreshold_keV.value / energy_keV) ** 3;
}

function curvesOf(z: number): ElementCurves {
  return kept(curves, z, () => buildCurves(z));
}

function buildCurves(z: number): ElementCurves {
  const table = elementTableOf(z);
  const logE = table.scatteringEnergies_keV.map(Math.log);
  const pairEnergies = table.scatteringEnergies_keV.slice(-table.pair.length);
  return {
    coherent: naturalSpline(logE, table.coherent.map(Math.log)),
    incoherent: naturalSpline(logE, table.incoherent.map(Math.log)),
    photoelectric: monotoneCubic(
      table.energies_keV.map(Math.log),
      table.photoelectric.map(Math.log),
    ),
    reducedPair: naturalSpline(
      pairEnergies.map(Math.log),
      table.pair.map((pair, i) => Math.log(pair / thresholdFactor(pairEnergies[i]))),
    ),
  };
}
