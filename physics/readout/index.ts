// From the detector plane to an answer, in the order a photon meets it.

export {
  type DetectorColumns,
  type DetectorResponse,
  detectorResponse,
} from './detector-response.js';
export { electronicVariance_per_mm2, quantumVariance_per_mm2 } from './electronic-noise.js';
// Grid.
export { type GridGeometry, gridGeometry } from './grid-geometry.js';
export { gridPerformance, imageImprovement } from './grid-performance.js';
export { type GridTable, gridAtEnergy, gridTable } from './grid-table.js';
export { type GridAtEnergy, gridTransmission, meanGridTransmission } from './grid-transmission.js';
export { iodineEquivalent_mg_per_cm2 } from './iodine-equivalent.js';
export { type KEmission, kEmissions } from './k-emission.js';
export { noiseAt, quantumSdnrSquareAt, sdnrAt } from './noise.js';
export { type NoiseTerms, noiseTerms } from './noise-terms.js';
export {
  type LinearContrast,
  type LinearReadout,
  readBeam,
  type SdnrCoefficients,
} from './readout.js';
// Answer.
export {
  type ChannelScatter,
  type ReadoutChain,
  type ReadoutWeights,
  readoutWeights,
} from './readout-weights.js';
export { type RoomGrid, roomGrid } from './room-grid.js';
// Detector.
export { slabEscape } from './slab-escape.js';
export { type HeldQuantity, type SolvedLoad, solveTubeLoad } from './solve-tube-load.js';
