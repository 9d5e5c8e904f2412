/** The worker that evaluates; the offline page takes `make-evaluation-worker.offline.ts` instead. */
export const makeEvaluationWorker = (): Worker =>
  new Worker(new URL('./evaluation-worker.js', import.meta.url), { type: 'module' });
