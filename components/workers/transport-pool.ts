import {
  type Batch,
  type BatchResult,
  combineBatches,
  transportBatches,
} from '../../physics/jobs/index.js';
import type { TransportInput, TransportScores } from '../../physics/transport/index.js';
import type { FromTransportWorker, TransportWorker } from './transport-messages.js';
import { WorkerLost } from './worker-lost.js';

/** How far a run has come. */
export interface TransportProgress {
  readonly photons: number;
  readonly ofPhotons: number;
  /** What the batches so far say; labelled incomplete. */
  readonly partial: () => TransportScores;
}

export interface TransportPool {
  /**
   * Flies a run. Runs wait for each other. Rejects with the signal's reason at once when it is
   * aborted, and with `WorkerLost` when workers keep dying.
   */
  readonly run: (
    input: TransportInput,
    options?: {
      readonly onProgress?: (progress: TransportProgress) => void;
      readonly signal?: AbortSignal;
    },
  ) => Promise<TransportScores>;
  /** Ends every worker; a run under way rejects. */
  readonly end: () => void;
}

/** Least time between two reports of progress. */
const reportEvery_ms = 50;
/** A run gives up when workers die more often than this. */
const mostLosses = 3;

type RunOptions = NonNullable<Parameters<TransportPool['run']>[1]>;

/** A run under way. */
interface Flight {
  readonly number: number;
  readonly input: TransportInput;
  readonly waiting: Batch[];
  readonly results: BatchResult[];
  readonly batches: number;
  readonly options: RunOptions;
  readonly resolve: (scores: TransportScores) => void;
  readonly reject: (error: unknown) => void;
  losses: number;
  reported_ms: number;
}

interface Member {
  readonly worker: TransportWorker;
  /** Number of the run it holds. */
  holds: number;
  work: { readonly flight: Flight; readonly batch: Batch } | null;
}

/**
 * A pool of `size` workers that share the batches of a run. Which worker flies which batch, and in
 * what order they come back, leaves no trace in the result.
 */
export function transportPool(make: () => TransportWorker, size: number): TransportPool {
  const members = new Set<Member>();
  let current: Flight | null = null;
  let before: Promise<unknown> = Promise.resolve();
  let runs = 0;

  const hire = (): void => {
    const member: Member = { worker: make(), holds: -1, work: null };
    members.add(member);
    member.worker.listen(
      (message) => take(member, message),
      (reason) => lose(member, reason),
    );
  };

  const feed = (): void => {
    if (current === null) return;
    while (members.size < size) hire();
    for (const member of members) {
      if (member.work !== null) continue;
      const batch = current.waiting.shift();
      if (batch === undefined) return;
      const { number: run, input } = current;
      if (member.holds !== run) member.worker.post({ kind: 'load', run, input });
      member.holds = run;
      member.work = { flight: current, batch };
      member.worker.post({ kind: 'fly', run, batch });
    }
  };

  const take = (member: Member, message: FromTransportWorker): void => {
    const flight = member.work?.flight;
    member.work = null;
    // What comes back for a run that was cancelled is dropped here.
    if (flight !== undefined && flight === current) {
      if (message.kind === 'failed') {
        flight.reject(new Error(message.message));
      } else {
        flight.results.push({ batch: message.batch, scores: message.scores });
        report(flight);
        if (flight.results.length === flight.batches) {
          flight.resolve(combineBatches(flight.input, flight.results));
        }
      }
    }
    feed();
  };

  const lose = (member: Member, reason: string): void => {
    if (!members.delete(member)) return;
    member.worker.end();
    if (current === null) return;
    if (member.work?.flight === current) current.waiting.unshift(member.work.batch);
    current.losses++;
    if (current.losses > mostLosses) current.reject(new WorkerLost(reason));
    else feed();
  };

  const start = (input: TransportInput, options: RunOptions): Promise<TransportScores> =>
    new Promise<TransportScores>((resolve, reject) => {
      options.signal?.throwIfAborted();
      const waiting = transportBatches(input);
      const batches = waiting.length;
      const rest = { options, resolve, reject, losses: 0, reported_ms: Number.NEGATIVE_INFINITY };
      current = { number: runs++, input, waiting, results: [], batches, ...rest };
      options.signal?.addEventListener('abort', () => reject(options.signal?.reason));
      feed();
    }).finally(() => {
      current = null;
    });

  return {
    run: (input, options = {}) => {
      const run = before.then(() => start(input, options));
      before = run.catch(() => undefined);
      return run;
    },
    end: () => {
      for (const { worker } of members) worker.end();
      members.clear();
      current?.reject(new WorkerLost('the pool was ended'));
    },
  };
}

function report(flight: Flight): void {
  const { input, results, options, batches } = flight;
  const now = performance.now();
  const isLast = results.length === batches;
  if (!options.onProgress || (!isLast && now - flight.reported_ms < reportEvery_ms)) return;
  flight.reported_ms = now;
  options.onProgress({
    photons: results.reduce((sum, { batch }) => sum + batch.photons, 0),
    ofPhotons: input.photons,
    partial: () => combineBatches(input, results),
  });
}
