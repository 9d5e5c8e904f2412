import { type AbsorbedAlong, absorbedAlong } from './absorbed-along.js';
import { type FirstScatterAlong, firstScatterAlong } from './first-scatter-along.js';
import type { OperatingPoint } from './operating-point.js';

/** What happens along the depth of the patient, for one technique at one size. */
export interface DepthProfiles {
  readonly technique: string;
  readonly size: string;
  /** Null where the estimate gives no deposition. */
  readonly absorbed: AbsorbedAlong | null;
  readonly firstScatter: FirstScatterAlong;
}

/** Absorbed energy and scatter along the depth; much more work than everything `evaluate` does. */
export const depthProfiles = (point: OperatingPoint): DepthProfiles => ({
  technique: point.technique.name,
  size: point.size.name,
  absorbed: absorbedAlong(point),
  firstScatter: firstScatterAlong(point),
});
