import type { ParsedCase } from '../../../physics/case/index.js';
import type { SweepPiece, SweepRequest } from '../../../physics/sweep.js';
import { sweepPieceCount } from '../../../physics/sweep.js';
import type { SweepPool } from '../../workers/sweep-pool.js';
import { type SweepState, sweepBasis } from './sweep-state.js';

export interface SweepRunner {
  /** Begins a sweep, the size of that name first; one under way is dropped. */
  readonly run: (parsed: ParsedCase, request: SweepRequest, firstSize: string) => Promise<void>;
  /** Stops at once; what is computed so far stays, labelled incomplete. */
  readonly cancel: () => void;
}

/** Least time between two tellings of progress. */
const tellEvery_ms = 120;

/** The pieces of a sweep, those of one size before the others. */
export const piecesInOrder = (request: SweepRequest, firstSize: string): number[] => {
  const { sizes, filters } = request.axes;
  const first = sizes.findIndex(({ name }) => name === firstSize);
  const isFirst = (index: number): boolean => Math.floor(index / filters.length) === first;
  const all = Array.from({ length: sweepPieceCount(request) }, (_, index) => index);
  return [...all.filter(isFirst), ...all.filter((index) => !isFirst(index))];
};

/** Runs one sweep at a time in a pool; `tell` hears of every change, no oftener than the eye needs. */
export function sweepRunner(
  pool: () => SweepPool,
  tell: (state: SweepState) => void,
  now_ms: () => number = () => performance.now(),
): SweepRunner {
  let stop = new AbortController();
  let state: SweepState | null = null;

  const change = (next: Partial<SweepState>) => {
    if (state === null) return;
    state = { ...state, ...next };
    tell(state);
  };

  const run: SweepRunner['run'] = async (parsed, request, firstSize) => {
    stop.abort();
    stop = new AbortController();
    const { signal } = stop;
    const begun_ms = now_ms();
    let told_ms = begun_ms;
    const order = piecesInOrder(request, firstSize);
    const pieces: (SweepPiece | null)[] = order.map(() => null);
    const basis = sweepBasis(parsed.case, request.holdConstant);
    state = { basis, request, phase: 'running', pieces: [...pieces], elapsed_ms: 0, message: '' };
    tell(state);
    const said = (phase: SweepState['phase'], message = '') =>
      change({ phase, message, pieces: [...pieces], elapsed_ms: now_ms() - begun_ms });
    const tasks = order.map((index) => ({ kind: 'sweepPiece', request, index }) as const);
    try {
      await pool().run(parsed, tasks, {
        signal,
        onAnswer: (at, piece) => {
          pieces[order[at]] = piece;
          if (now_ms() - told_ms < tellEvery_ms) return;
          told_ms = now_ms();
          said('running');
        },
      });
      said('done');
    } catch (error) {
      if (signal.aborted) {
        // A later sweep speaks for itself.
        if (stop.signal === signal) said('cancelled');
        return;
      }
      said('failed', error instanceof Error ? error.message : String(error));
    }
  };

  return { run, cancel: () => stop.abort() };
}
