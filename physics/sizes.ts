// What a case means for all its patients: percentiles, averages, who is worse off, the table.

export { binSizes, type Counted } from './sizes/bin-sizes.js';
export { type MixOutcome, mixOutcomes, outcomeSentence } from './sizes/mix-outcomes.js';
export { percentileThickness_mm, shownPercentiles } from './sizes/percentile.js';
export {
  type PercentileResult,
  percentileResult,
  percentileResults,
  type ThicknessResult,
  thicknessResult,
} from './sizes/percentile-results.js';
export type { TechniqueRow } from './sizes/technique-rows.js';
export { thicknessNodes } from './sizes/thickness-nodes.js';
