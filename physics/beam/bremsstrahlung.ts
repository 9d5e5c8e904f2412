import {
  depthCoefficients,
  polynomial,
  rangeCoefficients,
  shapeCoefficients,
  yieldCoefficients,
  yieldScale,
} from './tungsten-coefficients.js';

/** Electron range R0 in tungsten in g/cm² at tube potential T0 (model table, `rangeCoefficients`). */
export const electronRange_g_per_cm2 = (potential_kV: number): number =>
  Math.exp(polynomial(rangeCoefficients, Math.log(potential_kV / 100)));

/** The intermediate values of the closed form at one energy, for checks. */
export interface BremsstrahlungTerms {
  readonly yieldFactor: number;
  readonly depth_g_per_cm2: number;
  readonly shape: number;
  /** What escapes the anode: [1 + m ζ/(κ sinθ)]^(−κ). */
  readonly escapeProbability: number;
  /** Photons per keV, steradian and electron. */
  readonly photons_per_keV_sr_electron: number;
}

/**
 * Bremsstrahlung of a thick tungsten anode at constant potential, Stratabeam's closed form
 * (tungsten-coefficients.ts):
 *
 *     N(E) = 10⁻⁵ · Y · (T0 − E)/E · [1 + m(E) ζ/(κ sinθ)]^(−κ)
 *
 * @param potential_kV T0, 20 to 150
 * @param anodeAngle_deg θ, 6 to 22, take-off angle of the central ray
 * @returns a function of photon energy in keV and tungsten's total mass attenuation m in cm²/g,
 *   coherent included; zero at and above T0. Fitted from 9 keV; below, the effect on any filtered
 *   beam is under 0.03 %.
 * @example bremsstrahlung(100, 12)(30.25, 22.2381).photons_per_keV_sr_electron // 1.6646e-5
 */
export function bremsstrahlung(
  potential_kV: number,
  anodeAngle_deg: number,
): (energy_keV: number, massAttenuation_cm2_per_g: number) => BremsstrahlungTerms {
  const l = Math.log(potential_kV / 100);
  const range = electronRange_g_per_cm2(potential_kV);
  const sine = Math.sin((anodeAngle_deg * Math.PI) / 180);
  const [y0, y1, y2, y3, y4, y5] = yieldCoefficients.map((row) => polynomial(row, l));
  const [d0, d1, d2] = depthCoefficients.denominator;
  const [e0, e1] = depthCoefficients.exponent;
  const { constant, fourthPower } = shapeCoefficients;

  return (energy_keV, massAttenuation_cm2_per_g) => {
    const u = energy_keV / potential_kV;
    if (u >= 1) {
      return {
        yieldFactor: 0,
        depth_g_per_cm2: 0,
        shape: constant,
        escapeProbability: 1,
        photons_per_keV_sr_electron: 0,
      };
    }
    const v = 1 - u;
    const yieldFactor = y0 + u * (y1 + u * (y2 + u * (y3 + u * (y4 + u * y5))));
    const depth = ((range * v) / (d0 + d1 * Math.sqrt(v) + d2 * v)) * Math.exp(l * (e0 + e1 * v));
    const shape = constant - fourthPower * v * v * v * v;
    const escapeProbability = (1 + (massAttenuation_cm2_per_g * depth) / (shape * sine)) ** -shape;
    return {
      yieldFactor,
      depth_g_per_cm2: depth,
      shape,
      escapeProbability,
      photons_per_keV_sr_electron: (yieldScale * yieldFactor * escapeProbability * v) / u,
    };
  };
}
