import type { Case, Mode } from '../case/schema.js';
import type { Exposure } from '../results.js';
import type { Setting } from '../setting.js';

/** What a limit may look at: one technique at one size, already computed. */
export interface LimitInputs {
  readonly case: Case;
  readonly setting: Setting;
  readonly mode: Mode;
  readonly framesPerRun: number;
  readonly exposure: Exposure;
  readonly halfValueLayer_mmAl: number | null;
  readonly sourceToSkin_mm: number;
  readonly detectorAirKerma_uGy: number;
  readonly incidentAirKermaRate_mGy_per_min: number | null;
  /** Path of the technique in the case, for findings: `techniques[1]`. */
  readonly path: string;
}
