import type { TransportWorld } from './kernel.js';
import type { Primary } from './primary.js';
import type { ResponseTable } from './response-table.js';
import type { TallyBox } from './score-boxes.js';
import type { DisplacementScoring } from './score-displacement.js';
import type { ForcedScoring } from './score-forced.js';

/** A layer of the patient in the energy tally. */
export interface LayerRegion {
  readonly name: string;
  /** Regions of the tally that belong to it: its slab, and the insert if it holds it. */
  readonly regions: readonly number[];
  readonly mass_g_per_cm2: number;
  /** Field area at its mid-depth, cm²; 1 for a pencil, whose scores stand for a unit area. */
  readonly area_cm2: number;
}

/** One transport run, complete: clones to a worker and holds no function. */
export interface TransportInput extends TransportWorld {
  readonly photons: number;
  readonly seed: number;
  /** How scatter is scored; null when only absorbed energy is asked for. */
  readonly scoring: DisplacementScoring | ForcedScoring | null;
  readonly response: ResponseTable;
  /** E·(μen/ρ)air at the energy nodes. */
  readonly airKerma: Float64Array;
  readonly boxes: readonly TallyBox[];
  readonly layers: readonly LayerRegion[];
  readonly primary: Primary;
}
