import EvaluationWorker from './evaluation-worker.ts?worker&inline';

/** The same worker from code inside the page, for the one-file page that cannot fetch a script. */
export const makeEvaluationWorker = (): Worker => new EvaluationWorker();
