import { boundedMemo } from '../numeric/bounded-memo.js';

/** Incident energies the scatter responses are defined for; outside, the end value is held. */
export const scatterRange_keV: readonly [number, number] = [10, 150];

/** Greatest spacing of nodes from an energy upward: 2 keV below 40, 3 below 80, 4 above. */
const spacings: readonly { from_keV: number; spacing_keV: number }[] = [
  { from_keV: 10, spacing_keV: 2 },
  { from_keV: 40, spacing_keV: 3 },
  { from_keV: 80, spacing_keV: 4 },
];

/** An edge at E stands as the nodes E(1 − hair) and E, where the upper coefficients hold. */
const hair = 1e-6;

/** Parts into which an interval between nodes is cut for energies after scattering. */
const partsPerInterval = 8;

/**
 * Energies at which scatter is solved, and a finer grid holding all of them on which coefficients
 * and detector scores are tabulated for the energies between.
 */
export interface EnergyNodes {
  /** Ascending; neighbours one hair apart enclose an absorption edge. */
  readonly energies_keV: Float64Array;
  readonly fine_keV: Float64Array;
  /** Index in `fine_keV` of every node. */
  readonly fineIndex: Int32Array;
}

/** Edge sets remembered: a session sees a few; a threshold dragged along sees hundreds. */
const setsKept = 16;

const nodesBetween = boundedMemo<readonly number[], EnergyNodes>(
  setsKept,
  (edges) => edges.join(' '),
  makeNodes,
);

/**
 * Nodes from 10 to 150 keV with every edge as a doubled node; the same edges give the same object
 * while they are among the last asked for.
 */
export function energyNodes(edges_keV: readonly number[]): EnergyNodes {
  const [from, to] = scatterRange_keV;
  const edges = [...new Set(edges_keV)]
    .filter((edge) => edge > from * (1 + 2 * hair) && edge < to)
    .sort((a, b) => a - b)
    .filter((edge, i, all) => i === 0 || edge > all[i - 1] * (1 + 3 * hair));
  return nodesBetween(edges);
}

/** True where nodes i and i + 1 enclose an edge, across which nothing is interpolated. */
export const isEdge = (energies_keV: Float64Array, i: number): boolean =>
  energies_keV[i + 1] - energies_keV[i] < 2 * hair * energies_keV[i];

function makeNodes(edges: readonly number[]): EnergyNodes {
  const [from, to] = scatterRange_keV;
  const breaks = [...new Set([...edges, ...spacings.map((s) => s.from_keV), to])].sort(
    (a, b) => a - b,
  );
  const energies: number[] = [from];
  const fine: number[] = [from];
  const fineIndex: number[] = [0];
  for (let k = 1; k < breaks.length; k++) {
    const low = breaks[k - 1];
    const high = breaks[k];
    const isAtEdge = edges.includes(high);
    const top = isAtEdge ? high * (1 - hair) : high;
    const spacing = spacings.findLast((s) => s.from_keV <= low)?.spacing_keV ?? 2;
    const intervals = Math.ceil((high - low) / spacing - 1e-9);
    const parts = intervals * partsPerInterval;
    for (let part = 1; part <= parts; part++) {
      fine.push(low + ((top - low) * part) / parts);
      if (part % partsPerInterval === 0) {
        energies.push(fine[fine.length - 1]);
        fineIndex.push(fine.length - 1);
      }
    }
    if (isAtEdge) {
      energies.push(high);
      fine.push(high);
      fineIndex.push(fine.length - 1);
    }
  }
  return {
    energies_keV: Float64Array.from(energies),
    fine_keV: Float64Array.from(fine),
    fineIndex: Int32Array.from(fineIndex),
  };
}
