import { gaussLegendre } from '../../numeric/gauss-legendre.js';

/** Ordinates per hemisphere; the weights of one hemisphere sum to 1, of both to 2. */
export const ordinates = 8;
/** Index of the ray μ = 1, which has no weight: only photons from the tube travel along it. */
export const ray = ordinates;
/** Directions with a row of their own in every kernel: the ordinates and the ray. */
export const rows = ordinates + 1;

const { nodes, weights } = gaussLegendre(ordinates);

export const ordinateWeights = weights;

/** |μ| of every ordinate, then of the ray. */
export const cosines = Float64Array.from([...nodes, 1]);

/** The range of μ an ordinate stands for: as wide as its weight. */
export function ordinateCell(ordinate: number): readonly [number, number] {
  const from = weights.slice(0, ordinate).reduce((sum, weight) => sum + weight, 0);
  return [from, from + weights[ordinate]];
}
