/** Scatter, backscatter and deposition of a stack as responses to the incident energy. */

export { scatterRange_keV } from './energy-nodes.js';
export { equivalentSquare_mm } from './geometry.js';
export { responsesOn, toChannels } from './on-channels.js';
export type { DetectorScatter, ScatterResponses } from './responses.js';
export { firstOrderResponses, scatterResponses } from './scatter-responses.js';
export type { ScatterDetector, ScatterGrid } from './scores.js';
