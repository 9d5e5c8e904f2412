import { execFileSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';

/**
 * Momentum transfers q = sin(θ/2)/λ in 1/Å of the published tables (Hubbell et al. 1975). From q = 2.5
 * upward a few elements have a node elsewhere; there xraylib's own spline supplies the value.
 */
export const momentumTransfers_per_angstrom = [
  0.001, 0.005, 0.01, 0.015, 0.02, 0.025, 0.03, 0.04, 0.05, 0.07, 0.09, 0.1, 0.125, 0.15, 0.175,
  0.2, 0.25, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 1, 1.25, 1.5, 2, 2.5, 3, 3.5, 4, 5, 6, 7, 8, 10, 15,
  20, 50, 80, 100, 1000,
];

export interface ScatteringFunctions {
  readonly formFactor: readonly number[];
  readonly incoherent: readonly number[];
}

/** The text that the Python script prints: the input whose hash the ledger records. */
export function sampleScatteringFunctions(): string {
  const script = fileURLToPath(new URL('./scattering-functions.py', import.meta.url));
  return execFileSync('/usr/bin/python3', [script, ...momentumTransfers_per_angstrom.map(String)], {
    encoding: 'utf8',
  });
}

/** F and S of elements 1 to 92, at index Z, on `momentumTransfers_per_angstrom`. */
export function readScatteringFunctions(text: string): ScatteringFunctions[] {
  const nodeCount = momentumTransfers_per_angstrom.length;
  const elements = text
    .trim()
    .split('\n')
    .map((line) => line.split(' ').map(Number));
  return [
    { formFactor: [], incoherent: [] },
    ...elements.map((values) => ({
      formFactor: values.slice(0, nodeCount),
      incoherent: values.slice(nodeCount),
    })),
  ];
}
