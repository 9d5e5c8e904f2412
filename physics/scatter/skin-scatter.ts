import type { Stack } from '../stack/stack.js';
import { kernelOf } from './adjoint/kernel.js';
import { meshOf } from './adjoint/mesh.js';
import { solveAdjoint } from './adjoint/solve.js';
import { emptySources, scoreAtSkin } from './adjoint/sources.js';
import { backscatterShare } from './backscatter-share.js';
import type { EnergyNodes } from './energy-nodes.js';
import { forwardScatter } from './forward-scatter.js';
import { fieldAtSkin } from './geometry.js';
import { airKermaPerFluence } from './scores.js';
import type { Slab } from './slabs.js';

/**
 * Air kerma of all scattered photons at the skin on the axis over that of the primary, B − 1, over the
 * nodes. Without a support before the patient it is backscatter alone. Behind one it is the sum of
 * what the support scatters forward onto the skin, what the patient alone sends back, and what the two
 * give together (forward scatter sent back, backscatter turned round): from the infinite field, kept by
 * this one in the shares of both.
 *
 * @param broad the same of the whole stack in an infinite field.
 */
export function skinScatter(
  stack: Stack,
  slabs: readonly Slab[],
  nodes: EnergyNodes,
  broad: Float64Array,
): Float64Array {
  const backShare = backscatterShare(stack, slabs, nodes.energies_keV);
  const skin = slabs.findIndex(({ layerIndex }) => layerIndex !== null);
  if (skin <= 0) return broad.map((value, i) => value * backShare[i]);
  const forward = forwardScatter(slabs.slice(0, skin), fieldAtSkin(stack), nodes);
  const back = broadBackscatter(slabs.slice(skin), nodes);
  return broad.map((all, i) => {
    const together = Math.max(0, all - forward.broad[i] - back[i]);
    const forwardShare = forward.broad[i] > 0 ? forward.here[i] / forward.broad[i] : 1;
    return forward.here[i] + backShare[i] * (back[i] + forwardShare * together);
  });
}

/** Backscattered over incident air kerma of slabs that begin at the skin, infinite field. */
function broadBackscatter(slabs: readonly Slab[], nodes: EnergyNodes): Float64Array {
  const energies = nodes.energies_keV;
  const kernels = slabs.map(({ material }) => kernelOf(material, energies));
  const airKerma = airKermaPerFluence(energies);
  const sources = emptySources(energies.length, 1);
  scoreAtSkin(sources, 0, airKerma);
  const { total } = solveAdjoint(meshOf(slabs), kernels, energies, sources);
  return total.map((value, i) => value / airKerma[i]);
}
