/** How long work splits into seeded pieces that any number of workers can share. */
export { type Batch, planBatches } from './batches.js';
export {
  type BatchResult,
  combineBatches,
  runBatch,
  runTransport,
  transportBatches,
} from './transport-job.js';
