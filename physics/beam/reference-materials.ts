import { type Material, namedMaterial } from '../../materials/index.js';

/** Materials the beam is defined by: the anode, the absorbers of the standards, and air. */
export type ReferenceMaterialName = 'tungsten' | 'aluminium' | 'copper' | 'beryllium' | 'air';

/** One of them; always the same object, so that coefficients remembered by material are found. */
export function referenceMaterial(name: ReferenceMaterialName): Material {
  const material = namedMaterial(name);
  if (!material) throw new Error(`${name}: missing from the materials`);
  return material;
}
