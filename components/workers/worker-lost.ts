/** The worker stopped: out of memory, or its script could not be had. */
export class WorkerLost extends Error {}
