import { absorptionEdges, type Material } from '../../materials/index.js';

/** Just below an edge: a node this much under it, so that nothing is interpolated across. */
const hair = 1e-6;

/** Absorption edges of materials inside a range of energies, ascending, each once. */
export const edgesWithin = (
  materials: readonly Material[],
  from_keV: number,
  to_keV: number,
): number[] => {
  const edges = materials.flatMap((material) =>
    absorptionEdges(material, from_keV * 1.001, to_keV * 0.999),
  );
  return [...new Set(edges.map(({ energy_keV }) => energy_keV))].sort((a, b) => a - b);
};

/**
 * Energies evenly spaced in ln E from one end to the other, piece by piece between edges; every edge
 * stands as two nodes a hair apart, the upper one at the edge itself.
 *
 * @param edges_keV ascending, inside the range.
 * @param perUnit nodes per unit of ln E, about.
 */
export const edgeNodes = (
  from_keV: number,
  to_keV: number,
  edges_keV: readonly number[],
  perUnit: number,
): Float64Array => {
  const breaks = [from_keV, ...edges_keV, to_keV];
  const nodes: number[] = [];
  for (let k = 1; k < breaks.length; k++) {
    const low = breaks[k - 1];
    const high = k === breaks.length - 1 ? to_keV : breaks[k] * (1 - hair);
    const steps = Math.max(1, Math.round(Math.log(high / low) * perUnit));
    for (let i = 0; i <= steps; i++) nodes.push(low * (high / low) ** (i / steps));
  }
  return Float64Array.from(nodes);
};
