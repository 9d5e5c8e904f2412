import { type Material, partialCoefficientsOn } from '../../materials/index.js';
import type { Stack, StackLayer } from '../stack/stack.js';

/** A slab of what photons meet between entrance and exit, support included. */
export interface Slab {
  readonly material: Material;
  readonly thickness_cm: number;
  /** Index in `stack.layers`; null for support, which is no part of the patient. */
  readonly layerIndex: number | null;
}

/** Entrance to exit: support before the patient, layers, support behind. Empty slabs are left out. */
export function slabsOf(stack: Stack): Slab[] {
  const slab = (layer: StackLayer, layerIndex: number | null): Slab => ({
    material: layer.material,
    thickness_cm: layer.thickness_mm / 10,
    layerIndex,
  });
  return [
    ...stack.supportEntrance.map((layer) => slab(layer, null)),
    ...stack.layers.map(slab),
    ...stack.supportExit.map((layer) => slab(layer, null)),
  ].filter(({ thickness_cm }) => thickness_cm > 0);
}

/** Neighbours of one material joined, so that splitting a layer changes nothing. */
export function joinEqualNeighbours(slabs: readonly Slab[]): Slab[] {
  const joined: Slab[] = [];
  for (const slab of slabs) {
    const last = joined.at(-1);
    if (last?.material === slab.material) {
      joined[joined.length - 1] = { ...last, thickness_cm: last.thickness_cm + slab.thickness_cm };
    } else {
      joined.push(slab);
    }
  }
  return joined;
}

/** Linear coefficients of one slab on a grid of energies, 1/cm. */
export interface SlabCoefficients {
  readonly attenuation: Float64Array;
  readonly incoherent: Float64Array;
  readonly coherent: Float64Array;
  readonly photoelectric: Float64Array;
}

/** Linear coefficients of a material on a grid of energies, from its mass coefficients × density. */
export function linearCoefficients(
  material: Material,
  energies_keV: Float64Array,
): SlabCoefficients {
  const density = material.density_g_per_cm3;
  const mass = partialCoefficientsOn(material, energies_keV);
  const linear = (column: Float64Array) => column.map((value) => value * density);
  return {
    attenuation: mass.coherent.map(
      (value, i) => density * (value + mass.incoherent[i] + mass.photoelectric[i]),
    ),
    incoherent: linear(mass.incoherent),
    coherent: linear(mass.coherent),
    photoelectric: linear(mass.photoelectric),
  };
}

/** Mean number of interactions on a straight way through, over energies. */
export function opticalDepthOf(slabs: readonly Slab[], energies_keV: Float64Array): Float64Array {
  const depth = new Float64Array(energies_keV.length);
  for (const { material, thickness_cm } of slabs) {
    const { attenuation } = linearCoefficients(material, energies_keV);
    for (let i = 0; i < depth.length; i++) depth[i] += attenuation[i] * thickness_cm;
  }
  return depth;
}
