import { transportBatch } from '../transport/batch.js';
import type { TransportInput } from '../transport/input.js';
import type { TransportScores } from '../transport/scores.js';
import { type Batch, planBatches } from './batches.js';

/** The outcome of one batch, in any order. */
export interface BatchResult {
  readonly batch: Batch;
  readonly scores: Float64Array;
}

/** The batches of a run. */
export const transportBatches = (input: TransportInput): Batch[] => planBatches(input.photons);

/** One batch of a run: the work a worker is given. */
export const runBatch = (input: TransportInput, batch: Batch): BatchResult => ({
  batch,
  scores: transportBatch(input, batch),
});

/**
 * All batches at hand, put in batch order first, so that the sums have the same bits whoever computed
 * which batch and when it came back. `isComplete` false labels a partial result.
 */
export function combineBatches(
  input: TransportInput,
  results: readonly BatchResult[],
): TransportScores {
  const ordered = [...results].sort((a, b) => a.batch.index - b.batch.index);
  const photons = ordered.reduce((sum, { batch }) => sum + batch.photons, 0);
  return {
    photons,
    isComplete: photons === input.photons,
    batches: ordered.map(({ batch, scores }) => ({ photons: batch.photons, scores })),
  };
}

/** A whole run on the calling thread. */
export const runTransport = (input: TransportInput): TransportScores =>
  combineBatches(
    input,
    transportBatches(input).map((batch) => runBatch(input, batch)),
  );
