import type { Finding } from '../results.js';
import {
  type Estimated,
  type Transport,
  type TransportScores,
  transportResult,
} from '../transport/index.js';
import type { CheckEstimate } from './check-estimate.js';
import { type CheckRow, checkRows } from './check-rows.js';
import type { CheckSetup } from './check-setup.js';
import { statedBalance_fraction } from './stated-accuracy.js';

/** The answer to `transport`: the run, the estimate, and both side by side with a verdict each. */
export interface CheckReport extends Transport {
  readonly setting: string;
  readonly ofPhotons: number;
  readonly estimate: CheckEstimate;
  readonly rows: readonly CheckRow[];
  /** Whether all energy was found again. */
  readonly isBalanced: boolean;
  readonly findings: readonly Finding[];
}

/**
 * What a run, whole or under way, says of its setup.
 *
 * @param photonsPerSecond measured by the host, which has a clock; null when it did not.
 */
export const checkReport = (
  setup: CheckSetup,
  scores: TransportScores,
  photonsPerSecond: number | null,
): CheckReport => {
  const { request, input, hasGrid, estimate } = setup;
  const rows = checkRows(setup, scores);
  const { technique, size, photons: ofPhotons } = request;
  const labels = { technique, size, hasGrid, estimate, photonsPerSecond };
  const result = transportResult(input, scores, labels);
  return {
    ...result,
    // A grid the user measured stands in for the modelled one.
    sprBehindGrid: transportOf(rows, 'sprBehindGrid'),
    setting: setup.setting,
    ofPhotons,
    estimate,
    rows,
    isBalanced: Math.abs(result.energyBalance.sum - 1) <= statedBalance_fraction,
    findings: setup.findings,
  };
};

const transportOf = (rows: readonly CheckRow[], quantity: CheckRow['quantity']): Estimated | null =>
  rows.find((row) => row.quantity === quantity)?.transport ?? null;
