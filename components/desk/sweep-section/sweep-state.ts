import type { Case } from '../../../physics/case/schema.js';
import type { HoldConstant } from '../../../physics/results.js';
import type { CostName } from '../../../physics/sweep/costs.js';
import type { SweepSetting } from '../../../physics/sweep/sweep-setting.js';
import { withNearest } from '../../../physics/sweep/with-nearest.js';
import {
  combineSweep,
  type Sweep,
  type SweepPiece,
  type SweepRequest,
} from '../../../physics/sweep.js';

/** The sweep under way or last run. */
export interface SweepState {
  /** What the sweep depends on, to tell when it no longer belongs to the case: see `sweepBasis`. */
  readonly basis: string;
  readonly request: SweepRequest;
  readonly phase: 'running' | 'done' | 'cancelled' | 'failed';
  /** In the request's order; null until computed. */
  readonly pieces: readonly (SweepPiece | null)[];
  readonly elapsed_ms: number;
  /** Why it failed. */
  readonly message: string;
}

/**
 * Everything of a case that a sweep depends on, as one text: Proposed techniques and prose leave it
 * as it is, so that adopting a setting needs no new sweep.
 */
export const sweepBasis = (c: Case, hold: HoldConstant): string =>
  JSON.stringify([hold, c.materials, c.room, c.patient, c.task, c.agentsCompared, c.techniques[0]]);

/** How many pieces are computed. */
export const piecesDone = ({ pieces }: SweepState): number =>
  pieces.reduce((count, piece) => count + (piece ? 1 : 0), 0);

/** The pieces of one size, filter after filter; null until computed. */
export const piecesOfSize = (
  { request, pieces }: SweepState,
  size: string,
): readonly (SweepPiece | null)[] => {
  const { sizes, filters } = request.axes;
  const at = sizes.findIndex(({ name }) => name === size);
  return at < 0 ? [] : pieces.slice(at * filters.length, (at + 1) * filters.length);
};

/** The settings of one size as far as they are computed, limits naming the nearest allowed. */
export interface SizeSettings {
  readonly settings: readonly SweepSetting[];
  /** False while a filter is missing. */
  readonly isWhole: boolean;
}

const made = new WeakMap<SweepPiece, { own: readonly (SweepPiece | null)[]; of: SizeSettings }>();

/** The settings of one size; the same object while the pieces of that size are the same. */
export const settingsOfSize = (state: SweepState, size: string): SizeSettings => {
  const own = piecesOfSize(state, size);
  const first = own.find((piece) => piece !== null);
  if (!first) return nothingYet;
  const before = made.get(first);
  if (before?.own.every((piece, i) => piece === own[i])) return before.of;
  const known = own.flatMap((piece) => piece?.settings ?? []);
  const of = {
    settings: withNearest(known, state.request.axes.filters),
    isWhole: own.every((piece) => piece !== null),
  };
  made.set(first, { own, of });
  return of;
};

const nothingYet: SizeSettings = { settings: [], isWhole: false };

/** The whole sweep with its frontier, once every piece is there: for files, not for every frame. */
export const wholeSweep = (state: SweepState, costs: readonly CostName[]): Sweep | null => {
  const pieces = state.pieces.filter((piece) => piece !== null);
  return pieces.length === state.pieces.length
    ? combineSweep({ ...state.request, costs }, pieces)
    : null;
};
