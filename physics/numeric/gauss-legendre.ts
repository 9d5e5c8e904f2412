import { kept } from '../../materials/kept.js';

/** Nodes and weights on (0, 1); the weights sum to 1. */
export interface Quadrature {
  readonly nodes: Float64Array;
  readonly weights: Float64Array;
}

const made = new Map<number, Quadrature>();

/**
 * Gauss–Legendre quadrature of n points on (0, 1): roots of the Legendre polynomial by Newton's
 * method from Chebyshev-like starts (Abramowitz & Stegun 25.4.29–30), exact for degree 2n − 1.
 */
export function gaussLegendre(n: number): Quadrature {
  return kept(made, n, () => solve(n));
}

function solve(n: number): Quadrature {
  const nodes = new Float64Array(n);
  const weights = new Float64Array(n);
  for (let k = 0; k < n; k++) {
    let x = -Math.cos((Math.PI * (k + 0.75)) / (n + 0.5));
    let derivative = 0;
    for (let step = 0; step < 100; step++) {
      const legendre = legendreAt(n, x);
      derivative = legendre.derivative;
      const change = legendre.value / derivative;
      x -= change;
      if (Math.abs(change) < 1e-15) break;
    }
    nodes[k] = (1 + x) / 2;
    weights[k] = 1 / ((1 - x * x) * derivative * derivative);
  }
  return { nodes, weights };
}

function legendreAt(n: number, x: number): { value: number; derivative: number } {
  let before = 1;
  let value = x;
  for (let k = 2; k <= n; k++) {
    [before, value] = [value, ((2 * k - 1) * x * value - (k - 1) * before) / k];
  }
  return { value, derivative: (n * (x * value - before)) / (x * x - 1) };
}
