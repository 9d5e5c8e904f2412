import type { Evaluation } from '../../../physics/results.js';

/** One setting of the potential scan behind the curve, and what forbids it, if anything does. */
export interface ScanPoint {
  readonly potential_kV: number;
  readonly filter: string;
  readonly evaluation: Evaluation;
  readonly forbidden: string | null;
}
