import type { Case } from '../../physics/case/schema.js';
import { operatingPoint } from '../../physics/operating-point.js';
import type { HoldConstant } from '../../physics/results.js';
import { sizesOf } from '../../physics/stack/sizes.js';
import { type SweepSetting, sweepSetting } from '../../physics/sweep/sweep-setting.js';

/** A stretch of the potential scan: one filter, some potentials, at one size. */
export interface ScanRequest {
  readonly size: string;
  readonly filter: string;
  readonly potentials_kV: readonly number[];
  readonly hold: HoldConstant;
}

/**
 * Current with another potential and filter, everything else as it is, one quantity held equal to
 * what Current delivers as set. Empty where Current itself cannot be computed.
 */
export function scanSlice(
  c: Case,
  { size: name, filter, potentials_kV, hold }: ScanRequest,
): SweepSetting[] {
  const size = sizesOf(c.patient).find((entry) => entry.name === name);
  const [technique] = c.techniques;
  const current = size && operatingPoint(c, technique, size);
  if (!current || !('made' in current)) return [];
  return potentials_kV.map((potential_kV) =>
    sweepSetting(c, current, { potential_kV, filter, grid: technique.grid }, hold),
  );
}
