import { pageWorker } from './page-worker.js';
import type { TransportWorker } from './transport-messages.js';

/** A worker that flies photons; the offline page takes `make-transport-worker.offline.ts` instead. */
export const makeTransportWorker = (): TransportWorker =>
  pageWorker(new Worker(new URL('./transport-worker.js', import.meta.url), { type: 'module' }));
