import { type Remote, wrap } from 'comlink';
import type { AlongBeam } from '../../physics/along-beam.js';
import type { ParsedCase } from '../../physics/case/index.js';
import type { CheckRequest, NoCheck } from '../../physics/check-by-transport/index.js';
import type { DepthProfiles } from '../../physics/depth-profiles.js';
import type { Weighing } from '../../physics/results.js';
import type { SweepSetting } from '../../physics/sweep/sweep-setting.js';
import type { CheckStart } from './check-start.js';
import type { EvaluationHost } from './evaluation-host.js';
import type { ScanRequest } from './scan-slice.js';
import { WorkerLost } from './worker-lost.js';

/** The evaluation worker as async functions. Every promise settles, also when the worker dies. */
export interface Evaluator {
  readonly load: (parsed: ParsedCase) => Promise<void>;
  readonly weigh: (size: string) => Promise<Weighing>;
  readonly scan: (request: ScanRequest) => Promise<SweepSetting[]>;
  readonly along: (size: string) => Promise<AlongBeam[]>;
  readonly depths: (size: string) => Promise<DepthProfiles[]>;
  readonly check: (request: CheckRequest) => Promise<CheckStart | NoCheck>;
  readonly end: () => void;
}

/**
 * Starts the worker that `make` gives, and another one whenever one is lost. Calls under way when
 * it is lost reject with `WorkerLost`; the case must then be loaded again.
 */
export function startEvaluator(make: () => Worker): Evaluator {
  let worker: Worker | null = null;
  let remote: Remote<EvaluationHost> | null = null;
  const pending = new Set<(error: Error) => void>();

  const lose = (message: string) => {
    worker?.terminate();
    worker = null;
    remote = null;
    // Comlink's promises never settle after this, so ours reject in their place.
    for (const reject of pending) reject(new WorkerLost(message));
    pending.clear();
  };
  const host = (): Remote<EvaluationHost> => {
    if (remote) return remote;
    worker = make();
    worker.addEventListener('error', (event) =>
      lose(event.message || 'the worker could not start'),
    );
    worker.addEventListener('messageerror', () => lose('the worker’s answer could not be read'));
    remote = wrap<EvaluationHost>(worker);
    return remote;
  };
  const ask = <T>(call: (to: Remote<EvaluationHost>) => Promise<T>): Promise<T> =>
    new Promise((resolve, reject) => {
      pending.add(reject);
      call(host())
        .then(resolve, reject)
        .finally(() => pending.delete(reject));
    });

  return {
    load: (parsed) => ask((to) => to.load(parsed)),
    weigh: (size) => ask((to) => to.weigh(size)),
    scan: (request) => ask((to) => to.scan(request)),
    along: (size) => ask((to) => to.along(size)),
    depths: (size) => ask((to) => to.depths(size)),
    check: (request) => ask(async (to) => to.check(request)),
    end: () => lose('the evaluator was ended'),
  };
}
