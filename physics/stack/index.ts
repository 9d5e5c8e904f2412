// The patient in the room and the detail in the patient, in the order they are placed.

export { anchoredDistances, type Distances } from './anchor.js';
export { type DetailMatter, detailMatter } from './detail-matter.js';
export { type DetailPath, type DetailPaths, detailPaths, detailVolume_mL } from './detail-paths.js';
export { drawnThickness_mm, grownThicknesses_mm, growthShares } from './grow-layers.js';
export { layerTransmission } from './layer-transmission.js';
export { type DetailAgent, type PlacedDetail, placeDetail } from './place-detail.js';
export { placeStack, type Unplaceable } from './place-stack.js';
export { layerMaterial, resolveAgent, resolveMaterial } from './resolve-material.js';
export { sizesOf } from './sizes.js';
export { slabTransmissionOn } from './slab-transmission.js';
export type { Stack, StackLayer } from './stack.js';
