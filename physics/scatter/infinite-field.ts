import { kernelOf } from './adjoint/kernel.js';
import { meshOf } from './adjoint/mesh.js';
import { solveAdjoint } from './adjoint/solve.js';
import { stackSources } from './adjoint/stack-sources.js';
import type { EnergyNodes } from './energy-nodes.js';
import { airKermaPerFluence, type ScatterDetector, type ScatterGrid } from './scores.js';
import type { Slab } from './slabs.js';

/** What a stack does with a broad parallel beam, per photon incident at the skin, over the nodes. */
export interface InfiniteField {
  /** Scatter of the second order and above, K fluorescence included, over primary; by score. */
  readonly multiple: readonly Float64Array[];
  /** Air kerma of scattered photons at the skin, both ways, over that incident behind the support. */
  readonly backscatter: Float64Array;
  /** Energy left in each layer over incident energy; support scatters but is not listed. */
  readonly layerAbsorbedFraction: readonly Float64Array[];
}

/** Below this transmission the primary is no number to divide by. */
const leastPrimary = 1e-280;

/** Multiple scatter, backscatter and deposition in the laterally infinite stack (see `solveAdjoint`). */
export function infiniteField(
  slabs: readonly Slab[],
  layerCount: number,
  nodes: EnergyNodes,
  detector: ScatterDetector,
  grid: ScatterGrid | null,
): InfiniteField {
  const energies = nodes.energies_keV;
  const kernels = slabs.map(({ material }) => kernelOf(material, energies));
  const { sources, detectorScores, backscatter, layers } = stackSources(
    slabs,
    layerCount,
    energies,
    detector,
    grid,
  );
  const { width } = sources;
  const solution = solveAdjoint(meshOf(slabs), kernels, energies, sources);
  const atSkin = energies.map((_, i) => entranceTransmission(slabs, kernels, i));
  const airKerma = airKermaPerFluence(energies);
  const perIncident = (response: number, incident: Float64Array) =>
    incident.map((value, i) => solution.total[i * width + response] / (value * atSkin[i]));
  return {
    multiple: Array.from({ length: detectorScores }, (_, score) =>
      energies.map((_, i) => {
        const at = i * width + score;
        const primary = solution.uncollided[at];
        if (!(primary > leastPrimary)) return 0;
        return Math.max(0, (solution.total[at] - primary - solution.first[at]) / primary);
      }),
    ),
    backscatter: perIncident(backscatter, airKerma),
    layerAbsorbedFraction: layers.map((response) =>
      response < 0 ? new Float64Array(energies.length) : perIncident(response, energies),
    ),
  };
}

/** Share of the primary that support before the patient lets through. */
function entranceTransmission(
  slabs: readonly Slab[],
  kernels: readonly { readonly attenuation: Float64Array }[],
  i: number,
): number {
  let depth = 0;
  for (let k = 0; k < slabs.length && slabs[k].layerIndex === null; k++) {
    depth += kernels[k].attenuation[i] * slabs[k].thickness_cm;
  }
  return Math.max(leastPrimary, Math.exp(-depth));
}
