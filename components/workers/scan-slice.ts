import type { Case } from '../../physics/case/schema.js';
import { heldLoad } from '../../physics/compare.js';
import { evaluate } from '../../physics/evaluate.js';
import { operatingPoint } from '../../physics/operating-point.js';
import type { Evaluation, HoldConstant } from '../../physics/results.js';
import { sizesOf } from '../../physics/stack/sizes.js';
import type { ScanRequest } from './evaluation-host.js';

/** What the scan keeps equal to Current as set while potential varies. */
export type ScanHold = Exclude<HoldConstant, 'asSet'>;

/** One setting of the potential scan, and the code of the limit that forbids it, if one does. */
export interface ScanPoint {
  readonly potential_kV: number;
  readonly filter: string;
  readonly evaluation: Evaluation;
  readonly forbidden: string | null;
}

/**
 * Evaluations of Current with another potential and filter, everything else as it is, one quantity
 * held equal to what Current delivers as set. Settings that cannot be computed are left out.
 */
export function scanSlice(c: Case, request: ScanRequest): ScanPoint[] {
  const { filter, potentials_kV, hold } = request;
  const size = sizesOf(c.patient).find(({ name }) => name === request.size);
  if (!size) return [];
  const [technique] = c.techniques;
  const current = operatingPoint(c, technique, size);
  if (!('made' in current)) return [];
  const control = { tubeLoad_mAs: current.tubeLoad_mAs };
  return potentials_kV.flatMap((potential_kV) => {
    const point = operatingPoint(c, { ...technique, potential_kV, filter, control }, size);
    if (!('made' in point)) return [];
    const { tubeLoad_mAs } = heldLoad(current, point, hold);
    if (tubeLoad_mAs === null) return [];
    const evaluation = evaluate(c, { ...point, tubeLoad_mAs }, 0);
    const limit = evaluation.findings.find(({ severity }) => severity === 'limit');
    return [{ potential_kV, filter, evaluation, forbidden: limit?.code ?? null }];
  });
}
