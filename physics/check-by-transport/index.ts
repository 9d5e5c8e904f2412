/** The estimate held against photon transport: what is flown, what is compared, how it stands. */

export type { CheckEstimate } from './check-estimate.js';
export { type CheckReport, checkReport } from './check-report.js';
export type { CheckRequest } from './check-request.js';
export { type CheckedQuantity, type CheckRow, checkRows } from './check-rows.js';
export type { CheckSetup } from './check-setup.js';
export { type NoCheck, setUpCheck } from './set-up-check.js';
export {
  statedAccuracy_percent,
  statedBalance_fraction,
  statedMean_percent,
  statedSpread_percent,
} from './stated-accuracy.js';
export { type Fate, fates, fateWords, trackFates } from './track-fates.js';
export { type Judged, judge, photonsToDecide, type Verdict } from './verdict.js';
export { photonsText, verdictRule, verdictText } from './verdict-text.js';
