import type { Noise } from '../results.js';
import type { LinearReadout } from './readout.js';

/** SdNR of the detail in one displayed frame at a tube load: √(c m² / (a m + e + s m²)). */
export const sdnrAt = (
  { coefficients: { c, a, e, s } }: LinearReadout,
  tubeLoad_mAs: number,
): number => {
  const variance = a * tubeLoad_mAs + e + s * tubeLoad_mAs * tubeLoad_mAs;
  return variance > 0 ? Math.sqrt((c * tubeLoad_mAs * tubeLoad_mAs) / variance) : 0;
};

/**
 * SdNR² from quantum noise alone: what optimum tables use, because it is in proportion to dose. It
 * leaves out electronic noise, structure and background.
 */
export const quantumSdnrSquareAt = (
  { coefficients: { c, a } }: LinearReadout,
  tubeLoad_mAs: number,
): number => (a > 0 ? (c * tubeLoad_mAs) / a : 0);

/**
 * Noise of one displayed frame at a tube load, term by term: standard deviation of the mean over the
 * detail's effective area at the detector, relative to the total signal (primary and scatter). The
 * mask's share stands in quantum and electronic, its residue in structure and background. The total
 * is the root of the sum of squares, and SdNR = |detected contrast| / total.
 *
 * @returns fractions; all 0 where nothing reaches the detector or nothing is exposed.
 */
export const noiseAt = (readout: LinearReadout, tubeLoad_mAs: number): Noise => {
  const { coefficients, effectiveArea_mm2, structureVariance, backgroundVariance } = readout;
  const signal = readout.signalTotal_per_mm2_per_mAs * tubeLoad_mAs;
  const relative = (variance_per_mm2: number): number =>
    signal > 0 && effectiveArea_mm2 > 0
      ? Math.sqrt(variance_per_mm2 / effectiveArea_mm2) / signal
      : 0;
  const square = tubeLoad_mAs * tubeLoad_mAs;
  const { a, e, s } = coefficients;
  return {
    quantum: relative(a * tubeLoad_mAs),
    electronic: relative(e),
    structure: relative(structureVariance * square),
    background: relative(backgroundVariance * square),
    total: relative(a * tubeLoad_mAs + e + s * square),
  };
};
