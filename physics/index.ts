// What Stratabeam computes, in the order of a decision.

export { type AlongBeam, alongBeam } from './along-beam.js';
// The beam, and one operating point of the room.
export * from './beam/index.js';
// The case.
export * from './case/index.js';
export { sharedWith } from './case/shared-with.js';
export { cautions } from './cautions.js';
export { compare, holdConstants, holdConstantWords } from './compare.js';
export { evaluate } from './evaluate.js';
export { isAllowed } from './limits.js';
export { type OperatingPoint, operatingPoint } from './operating-point.js';
// Weighing: every technique at every size, every Proposed against Current.
export * from './results.js';
// The decision: all settings, what no setting beats, who is worse off, what to solve for.
export { roomPotentials_kV } from './room-potentials.js';
export { type RuleDeparture, rulesOfThumb } from './rules-of-thumb.js';
export { mixOutcomes, outcomeSentence, percentileResults } from './sizes.js';
export * from './solve.js';
export { type Sweep, type SweepRequest, sweep, wholeRoom } from './sweep.js';
export { version } from './version.js';
export { weigh } from './weigh.js';
