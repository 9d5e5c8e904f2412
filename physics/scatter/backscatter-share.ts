import type { Stack } from '../stack/stack.js';
import { equivalentWater } from './equivalent-water.js';
import { backscatterFieldShare } from './field-table.js';
import { fieldAtSkin } from './geometry.js';
import type { Slab } from './slabs.js';

/** Depth whose scattering decides how far backscatter spreads along the skin. */
const backscatterDepth_cm = 5;

/**
 * Share of the infinite field's backscatter that the field at the skin keeps, over the nodes: that of
 * thick water, the field scaled by how densely the first 5 cm scatter.
 */
export function backscatterShare(
  stack: Stack,
  slabs: readonly Slab[],
  energies_keV: Float64Array,
): Float64Array {
  const { halfSide_cm } = fieldAtSkin(stack);
  const near = uppermost(
    slabs.filter(({ layerIndex }) => layerIndex !== null),
    backscatterDepth_cm,
  );
  const depth_cm = near.reduce((sum, { thickness_cm }) => sum + thickness_cm, 0);
  const water = equivalentWater(near, energies_keV);
  return water.energy_keV.map((energy, i) =>
    backscatterFieldShare(energy, halfSide_cm * (depth_cm > 0 ? water.thickness_cm[i] / depth_cm : 1)),
  );
}

/** The first `depth_cm` of a stack. */
function uppermost(slabs: readonly Slab[], depth_cm: number): Slab[] {
  let left = depth_cm;
  return slabs.flatMap((slab) => {
    const thickness_cm = Math.min(left, slab.thickness_cm);
    left -= thickness_cm;
    return thickness_cm > 0 ? [{ ...slab, thickness_cm }] : [];
  });
}
