import type { Case } from '../../../physics/case/schema.js';
import type { CheckReport, CheckRequest, Fate } from '../../../physics/check-by-transport/index.js';
import type { Estimated, Track } from '../../../physics/transport/index.js';

/** What every row of the report said after so many photons. */
export interface CheckPoint {
  readonly photons: number;
  readonly values: readonly Estimated[];
}

/** The run under way or last flown. */
export interface CheckState {
  readonly request: CheckRequest;
  /** What the run depends on, to tell when it no longer belongs to the case: see `checkBasis`. */
  readonly basis: string;
  readonly phase: 'preparing' | 'flying' | 'done' | 'cancelled' | 'failed';
  /** What the photons so far say; null before the first batch. */
  readonly report: CheckReport | null;
  /** The same along the way, thinned. */
  readonly history: readonly CheckPoint[];
  readonly tracks: readonly Track[];
  readonly fates: Readonly<Record<Fate, number>> | null;
  /** Why it ended early. */
  readonly message: string;
}

/** True while photons are being flown or made ready. */
export const isRunning = ({ phase }: CheckState): boolean =>
  phase === 'preparing' || phase === 'flying';

/**
 * Everything of a case that the run of a technique depends on, as one text. Titles, the task, rules
 * and the other techniques leave it as it is.
 */
export const checkBasis = (c: Case, technique: string): string => {
  const { tube, source, readings, filters, support, geometry, grid, detector } = c.room;
  const flown = c.techniques.find(({ name }) => name === technique);
  return JSON.stringify([
    c.materials,
    [tube, source, readings, filters, support, geometry, grid, detector],
    c.patient,
    flown && [flown.potential_kV, flown.filter, flown.grid, flown.control],
  ]);
};
