import type { EnergyNodes } from './energy-nodes.js';
import { firstOrderParts } from './first-order-parts.js';
import { valuesPerPoint } from './first-order-points.js';
import { broadened, type ScatterGeometry } from './geometry.js';
import { type ScatterGrid, scoreAngles, scoreBetas_rad } from './scores.js';
import type { Slab } from './slabs.js';

/**
 * Multiply scattered photons reach the grid with about this share of the incident energy. A round mean of
 * our own, taken over with the method and not fitted here; it enters a ratio of two transmissions only,
 * and what it leaves shows in the grid columns of test/reference/scatter-accuracy.csv (2026-12-01).
 */
const meanEnergyShare = 0.88;

/** Share of isotropically scattered photons that a grid lets through, or a ratio of two such. */
export interface GridShare {
  /** Of photons through the detector plane. */
  readonly plane: Float64Array;
  /** Of their fluence, weighted 1/cosβ. */
  readonly fluence: Float64Array;
}

/**
 * How a finite field's multiple scatter passes the grid over how an infinite one's does, G/G∞, over the
 * nodes: scatter from near the axis meets the grid less obliquely.
 */
export function gridGains(
  slabs: readonly Slab[],
  geometry: ScatterGeometry,
  nodes: EnergyNodes,
  grid: ScatterGrid,
): GridShare {
  const here = gridShare(slabs, geometry, nodes, grid);
  const broad = gridShare(slabs, broadened(geometry), nodes, grid);
  const over = (weighting: keyof GridShare) =>
    here[weighting].map((value, i) => (broad[weighting][i] > 0 ? value / broad[weighting][i] : 1));
  return { plane: over('plane'), fluence: over('fluence') };
}

/**
 * G = N/D, N = Σ∫dz∫sinβ dβ σ_s W e^{−τ_out(secβ − 1)} T̄(0.88 E, β), D the same without T̄.
 */
function gridShare(
  slabs: readonly Slab[],
  geometry: ScatterGeometry,
  nodes: EnergyNodes,
  grid: ScatterGrid,
): GridShare {
  const parts = firstOrderParts(slabs, geometry, nodes.fine_keV);
  const transmission = new Float64Array(scoreAngles);
  const plane = new Float64Array(nodes.energies_keV.length);
  const fluence = new Float64Array(nodes.energies_keV.length);
  nodes.energies_keV.forEach((energy, i) => {
    const here = nodes.fineIndex[i];
    for (let j = 0; j < scoreAngles; j++) {
      transmission[j] = grid.lookup(meanEnergyShare * energy, Math.cos(scoreBetas_rad[j]));
    }
    const through = [0, 0];
    const all = [0, 0];
    for (const { below, linear, pointsFor } of parts) {
      const mu = linear.attenuation[here];
      const scatter = linear.incoherent[here] + linear.coherent[here];
      const points = pointsFor(mu);
      for (let at = 0; at < points.length; at += valuesPerPoint) {
        const secant = points[at + 3];
        const tauOut = below[here] + mu * points[at];
        const amount = points[at + 1] * scatter * Math.exp(tauOut * (1 - secant));
        const j = points[at + 6] | 0;
        const share = points[at + 6] - j;
        const passed = transmission[j] + share * (transmission[j + 1] - transmission[j]);
        all[0] += amount;
        all[1] += amount * secant;
        through[0] += amount * passed;
        through[1] += amount * secant * passed;
      }
    }
    plane[i] = all[0] > 0 ? through[0] / all[0] : 1;
    fluence[i] = all[1] > 0 ? through[1] / all[1] : 1;
  });
  return { plane, fluence };
}
