import type { MaterialLayer } from './attenuate.js';
import { referenceMaterial } from './reference-materials.js';

/** The air between two points of the beam as a layer, e.g. `attenuate(beam, [airPath(1000)])`. */
export const airPath = (distance_mm: number): MaterialLayer => ({
  material: referenceMaterial('air'),
  thickness_mm: distance_mm,
});
