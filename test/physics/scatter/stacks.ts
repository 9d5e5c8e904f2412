import { type Material, namedMaterial } from '../../../materials/index.js';
import type { ScatterDetector } from '../../../physics/scatter/index.js';
import type { Stack, StackLayer } from '../../../physics/stack/stack.js';

/** A named material that must exist. */
export function material(name: string): Material {
  const found = namedMaterial(name);
  if (!found) throw new Error(`${name}: must be a named material`);
  return found;
}

/** Absorbs every photon whole. `edges_keV` adds energy nodes, so that a test can ask for an energy. */
export const idealDetector = (...edges_keV: number[]): ScatterDetector => ({
  efficiency: () => 1,
  energyFraction: () => 1,
  energySquareFraction: () => 1,
  edges_keV,
});

/** Layers of (material, cm) in a geometry; unless said: parallel, contact, 30 × 30 cm at 100 cm. */
export function stackOf(
  layers: readonly (readonly [Material, number])[],
  geometry: Partial<Stack> = {},
): Stack {
  const slabs: StackLayer[] = layers.map(([each, thickness_cm], i) => ({
    name: `${i} ${each.name}`,
    material: each,
    thickness_mm: thickness_cm * 10,
  }));
  const thickness_mm = slabs.reduce((sum, slab) => sum + slab.thickness_mm, 0);
  const { sourceToDetector_mm = 1000, exitToDetector_mm = 0 } = geometry;
  return {
    sizeName: 'test',
    thickness_mm,
    layers: slabs,
    supportEntrance: [],
    supportExit: [],
    beam: 'parallel',
    sourceToDetector_mm,
    sourceToSkin_mm: sourceToDetector_mm - exitToDetector_mm - thickness_mm,
    exitToDetector_mm,
    field_mm: [300, 300],
    air: false,
    ...geometry,
  };
}
