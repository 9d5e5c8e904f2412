import type { CheckReport } from '../../../physics/check-by-transport/index.js';
import type { CheckPoint } from './check-state.js';

/** A point is kept when the photons have grown by this factor since the last one kept. */
const growth = 1.06;

/** The history with what a report says at its end; points too near to be told apart are let go. */
export function withReport(
  history: readonly CheckPoint[],
  { photons, rows }: CheckReport,
): readonly CheckPoint[] {
  const point = { photons, values: rows.map(({ transport }) => transport) };
  const before = history.at(-2);
  const isNear = before !== undefined && (history.at(-1)?.photons ?? 0) < growth * before.photons;
  return [...(isNear ? history.slice(0, -1) : history), point];
}
