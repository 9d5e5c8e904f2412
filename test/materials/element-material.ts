import { elementByZ, type Material, namedMaterial } from '../../materials/index.js';

/** The material of a pure element. */
export function elementMaterial(z: number): Material {
  return known(elementByZ(z).name);
}

/** A named material that must exist. */
export function known(name: string): Material {
  const material = namedMaterial(name);
  if (!material) throw new Error(`${name}: must be a named material`);
  return material;
}
