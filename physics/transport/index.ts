/** Photon transport by Monte Carlo: a run built once, its scores, what they say. */

export type { InsertRequest } from './build-geometry.js';
export { buildTransportInput, type TransportOptions } from './build-input.js';
export type { LayerRegion, TransportInput } from './input.js';
export { type DetectorFunctions, type GridFunction, idealDetector } from './response-table.js';
export {
  type EnergyBalance,
  energyBalance,
  type Transport,
  type TransportEstimate,
  type TransportLabels,
  type TransportLayer,
  transportResult,
} from './result.js';
export type { TallyBox } from './score-boxes.js';
export {
  backscatterFactor,
  boxEnergies_keV,
  type Estimated,
  estimated,
  impartedEnergy_keV,
  layerEnergy_keV,
  type SprChoice,
  scatterToPrimary,
  type TransportScores,
} from './scores.js';
export { recordTracks, type Track, trackPoints } from './tracks.js';
