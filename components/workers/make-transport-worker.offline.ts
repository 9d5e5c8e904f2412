import { pageWorker } from './page-worker.js';
import type { TransportWorker } from './transport-messages.js';
import Inlined from './transport-worker.ts?worker&inline';

/** The same worker from code inside the page, for the one-file page that cannot fetch a script. */
export const makeTransportWorker = (): TransportWorker => pageWorker(new Inlined());
