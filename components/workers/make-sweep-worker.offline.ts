import { pageWorker } from './page-worker.js';
import type { SweepWorker } from './sweep-messages.js';
import Inlined from './sweep-worker.ts?worker&inline';

/** The same worker from code inside the page, for the one-file page that cannot fetch a script. */
export const makeSweepWorker = (): SweepWorker => pageWorker(new Inlined());
