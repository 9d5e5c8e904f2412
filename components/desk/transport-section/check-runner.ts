import type { ParsedCase } from '../../../physics/case/index.js';
import {
  type CheckReport,
  type CheckRequest,
  type CheckSetup,
  checkReport,
} from '../../../physics/check-by-transport/index.js';
import type { TransportScores } from '../../../physics/transport/index.js';
import type { Evaluator } from '../../workers/evaluator.js';
import { photonRate } from '../../workers/photon-rate.js';
import type { TransportPool } from '../../workers/transport-pool.js';
import { withReport } from './check-history.js';
import { type CheckState, checkBasis, isRunning } from './check-state.js';

/** What a runner works with; both are made when the first run needs them. */
export interface CheckParts {
  readonly evaluator: () => Pick<Evaluator, 'load' | 'check'>;
  readonly pool: () => TransportPool;
  readonly now_ms: () => number;
}

export interface CheckRunner {
  /** Begins a run; one under way is cancelled. */
  readonly run: (parsed: ParsedCase, request: CheckRequest) => Promise<void>;
  /** Ends the run under way at once; what it has said so far stays, labelled incomplete. */
  readonly cancel: (message?: string) => void;
}

/**
 * Flies checks one at a time: a worker makes the run ready, the pool flies it, and `tell` hears of
 * every change of state. Nothing heavy happens on the calling thread.
 */
export function checkRunner(parts: CheckParts, tell: (state: CheckState) => void): CheckRunner {
  let state: CheckState | null = null;
  let stop = new AbortController();

  const change = (next: Partial<CheckState>) => {
    if (state === null) return;
    state = { ...state, ...next };
    tell(state);
  };

  const cancel = (message = 'cancelled') => {
    if (state === null || !isRunning(state)) return;
    stop.abort();
    change({ phase: 'cancelled', message });
  };

  const fly = async (setup: CheckSetup, signal: AbortSignal) => {
    const rate = photonRate(parts.now_ms);
    const report = (scores: TransportScores): CheckReport =>
      checkReport(setup, scores, rate(scores.photons));
    const heard = (scores: TransportScores, phase: 'flying' | 'done') => {
      const said = report(scores);
      change({ phase, report: said, history: withReport(state?.history ?? [], said) });
    };
    const scores = await parts.pool().run(setup.input, {
      signal,
      onProgress: ({ partial, photons, ofPhotons }) => {
        if (!signal.aborted && photons < ofPhotons) heard(partial(), 'flying');
      },
    });
    heard(scores, 'done');
  };

  return {
    cancel,
    run: async (parsed, request) => {
      cancel();
      stop = new AbortController();
      const { signal } = stop;
      state = {
        request,
        basis: checkBasis(parsed.case, request.technique),
        phase: 'preparing',
        report: null,
        history: [],
        tracks: [],
        fates: null,
        message: '',
      };
      tell(state);
      try {
        const evaluator = parts.evaluator();
        const [, start] = await Promise.all([evaluator.load(parsed), evaluator.check(request)]);
        if (signal.aborted) return;
        if (!('setup' in start)) {
          change({ phase: 'failed', message: start.findings[0]?.message ?? '' });
          return;
        }
        change({ phase: 'flying', tracks: start.tracks, fates: start.fates });
        await fly(start.setup, signal);
      } catch (error) {
        if (signal.aborted) return;
        change({
          phase: 'failed',
          message: error instanceof Error ? error.message : String(error),
        });
      }
    },
  };
}
