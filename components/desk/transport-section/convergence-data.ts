import type { CheckReport } from '../../../physics/check-by-transport/index.js';
import type { ConvergenceData } from '../../charts/transport-convergence.js';
import type { CheckState } from './check-state.js';

/** One row of a report with its history, for the chart. */
export function convergenceData(
  { request, history }: CheckState,
  { rows, technique, size }: CheckReport,
  index: number,
  ink: number,
): ConvergenceData {
  const row = rows[index] ?? rows[0];
  const at = rows.indexOf(row);
  return {
    quantity: [row.name, row.layer].filter(Boolean).join(', '),
    unit: row.unit,
    technique,
    ink,
    size,
    estimate: row.estimate,
    tolerance_percent: row.tolerance_percent,
    points: history.map(({ photons, values }) => ({ photons, ...values[at] })),
    ofPhotons: request.photons,
  };
}
