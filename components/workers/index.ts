// Hosts for physics away from the page, and what speaks to them.

export type { DetailSpectra } from './detail-spectra.js';
export { type EvaluationHost, evaluationHost, type ScanRequest } from './evaluation-host.js';
export { type Evaluator, startEvaluator, WorkerLost } from './evaluator.js';
export { latestWins, superseded } from './latest-wins.js';
export { makeEvaluationWorker } from './make-evaluation-worker.js';
export { scanSlice, type ScanHold, type ScanPoint } from './scan-slice.js';
