import { electronRange_g_per_cm2 } from './bremsstrahlung.js';
import {
  kEdge_keV,
  kFluorescenceYield,
  lowestLinePotential_kV,
  polynomial,
  vacancyCoefficients,
  vacancyDepthCoefficients,
  vacancyShape,
} from './tungsten-coefficients.js';

/**
 * Photons of one tungsten K line per steradian and electron, Stratabeam's closed form
 * (tungsten-coefficients.ts): vacancies made directly by electrons and by bremsstrahlung, each with
 * its own depth,
 *
 *     N = ω f/(4π) · [V_d (1 + m ζ_d/(1.7 sinθ))^(−1.7) + V_i (1 + m ζ_i/(0.6456 sinθ))^(−0.6456)]
 *
 * @param potential_kV T0; below 69.7 kV the result is 0
 * @param anodeAngle_deg θ, 6 to 22
 * @returns a function of the line's share f and of tungsten's total mass attenuation m in cm²/g at
 *   the line's energy
 * @example characteristicLine(150, 16)(0.50243, 3.823) // 6.5799e-5
 */
export function characteristicLine(
  potential_kV: number,
  anodeAngle_deg: number,
): (share: number, massAttenuation_cm2_per_g: number) => number {
  if (potential_kV < lowestLinePotential_kV) return () => 0;
  const sine = Math.sin((anodeAngle_deg * Math.PI) / 180);
  const excess = Math.log(potential_kV / kEdge_keV - 1);
  const w = 1 - kEdge_keV / potential_kV;
  const [d0, d1] = vacancyDepthCoefficients.directDenominator;
  const ways = [
    {
      vacancies: Math.exp(polynomial(vacancyCoefficients.direct, excess)),
      depth: (electronRange_g_per_cm2(potential_kV) * w) / (d0 + d1 * Math.sqrt(w)),
      shape: vacancyShape.direct,
    },
    {
      vacancies: Math.exp(polynomial(vacancyCoefficients.indirect, excess)),
      depth: polynomial(vacancyDepthCoefficients.indirect, (potential_kV - 100) / 100),
      shape: vacancyShape.indirect,
    },
  ];
  return (share, massAttenuation_cm2_per_g) => {
    const escaping = ways.map(
      ({ vacancies, depth, shape }) =>
        vacancies * (1 + (massAttenuation_cm2_per_g * depth) / (shape * sine)) ** -shape,
    );
    return ((kFluorescenceYield * share) / (4 * Math.PI)) * (escaping[0] + escaping[1]);
  };
}
