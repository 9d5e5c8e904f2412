import { gaussLegendre } from '../numeric/gauss-legendre.js';

const polar = gaussLegendre(24);

/** (1 − e^{−y})/y, for y ≥ 0. */
const meanOfExponential = (y: number): number => (y > 1e-8 ? -Math.expm1(-y) / y : 1 - y / 2);

/**
 * Probability that a fluorescence photon, born where a photon interacts in a slab, leaves it.
 *
 * In mean free paths of the incoming photon along its own path through the slab, α = μm/cosβ, the
 * depth of interaction has the density e^{−αs}·α/(1 − e^{−α}) over 0 ≤ s ≤ 1. The line, emitted
 * evenly in all directions, has the depth b = μ_line·m of the slab to cross; in the direction u
 * (cosine to the normal) it passes the front with e^{−bs/u} and the back with e^{−b(1−s)/u}. Over
 * depth both integrate in closed form,
 *   front: α/(α + b/u)·(1 − e^{−(α + b/u)}),  back: α(e^{−α} − e^{−b/u})/(b/u − α),
 * and half of each over 0 < u < 1 by 24 Gauss–Legendre points is the escape. For α → ∞ it tends to
 * the half-space value ½, for b → 0 to 1.
 *
 * @param depth α > 0; @param lineDepth b ≥ 0.
 * @returns 0 to 1.
 */
export const slabEscape = (depth: number, lineDepth: number): number => {
  if (!(depth > 0)) return slabEscape(1e-6, lineDepth);
  let sum = 0;
  for (let k = 0; k < polar.nodes.length; k++) {
    const along = lineDepth / polar.nodes[k];
    const front = -Math.expm1(-(depth + along)) / (depth + along);
    const back = Math.exp(-Math.min(depth, along)) * meanOfExponential(Math.abs(along - depth));
    sum += polar.weights[k] * (front + back);
  }
  return (depth * sum) / (2 * -Math.expm1(-depth));
};
