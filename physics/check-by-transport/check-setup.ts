import type { Finding } from '../results.js';
import type { TransportInput } from '../transport/index.js';
import type { ColumnPart } from './central-column.js';
import type { CheckEstimate } from './check-estimate.js';
import type { CheckRequest } from './check-request.js';

/** Everything a check needs, made once: clones to a page and to workers. */
export interface CheckSetup {
  readonly request: CheckRequest;
  /** `80 kV, no filter, grid in`. */
  readonly setting: string;
  readonly input: TransportInput;
  readonly estimate: CheckEstimate;
  readonly hasGrid: boolean;
  /** Scatter over primary transmission of a grid the user measured; null where the model holds. */
  readonly measuredGridShare: number | null;
  /** Of one frame as set, on the axis at the skin, without backscatter. */
  readonly incidentAirKerma_mGy: number;
  /** Field area a pencil stands for at the skin; 1 where the photons of the run fill the field. */
  readonly pencilField_cm2: number;
  /** The central column in each layer, tallied in `input.boxes`; empty for a pencil. */
  readonly column: readonly ColumnPart[];
  /** What the two do not have in common, and where the stated accuracy was not tried. */
  readonly findings: readonly Finding[];
}
