import { pageWorker } from './page-worker.js';
import type { SweepWorker } from './sweep-messages.js';

/** A worker for sweeps and solving; the offline page takes `make-sweep-worker.offline.ts` instead. */
export const makeSweepWorker = (): SweepWorker =>
  pageWorker(new Worker(new URL('./sweep-worker.js', import.meta.url), { type: 'module' }));
