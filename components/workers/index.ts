// Hosts for physics away from the page, and what speaks to them.

export { type EvaluationHost, evaluationHost } from './evaluation-host.js';
export { type Evaluator, startEvaluator } from './evaluator.js';
export { latestWins, superseded } from './latest-wins.js';
export { makeEvaluationWorker } from './make-evaluation-worker.js';
export { makeTransportWorker } from './make-transport-worker.js';
export { type ScanRequest, scanSlice } from './scan-slice.js';
export type { TransportWorker } from './transport-messages.js';
export { type TransportPool, type TransportProgress, transportPool } from './transport-pool.js';
export { WorkerLost } from './worker-lost.js';
