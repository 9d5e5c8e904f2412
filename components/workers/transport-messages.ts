import type { Batch } from '../../physics/jobs/index.js';
import type { TransportInput } from '../../physics/transport/index.js';
import type { PoolWorker } from './page-worker.js';

/** To a transport worker: a run to hold ready, or one of its batches to fly. */
export type ToTransportWorker =
  | { readonly kind: 'load'; readonly run: number; readonly input: TransportInput }
  | { readonly kind: 'fly'; readonly run: number; readonly batch: Batch };

/** From it: a batch's scores, or why it has none. */
export type FromTransportWorker =
  | {
      readonly kind: 'scores';
      readonly run: number;
      readonly batch: Batch;
      readonly scores: Float64Array;
    }
  | { readonly kind: 'failed'; readonly run: number; readonly message: string };

/** A worker of the page or a thread of Node, as the pool sees it. */
export type TransportWorker = PoolWorker<ToTransportWorker, FromTransportWorker>;
