import type { GridPerformance } from '../results.js';
import { gridPerformance } from './grid-performance.js';
import { type ReadoutWeights, Row } from './readout-weights.js';

/**
 * One displayed frame as it depends on tube load m (mAs). Signals are in detector signal per mm²:
 * keV, or counts when counting; all of the reference background unless named otherwise.
 */
export interface LinearReadout {
  readonly signalPrimary_per_mm2_per_mAs: number;
  readonly signalTotal_per_mm2_per_mAs: number;
  /** Background minus detail on the central path; negative where the detail is more transparent. */
  readonly signalDifference_per_mm2_per_mAs: number;
  readonly detectorAirKermaPrimary_uGy_per_mAs: number;
  /** Primary and scatter, behind the grid, before the detector cover, field centre. */
  readonly detectorAirKerma_uGy_per_mAs: number;
  readonly spr: number;
  readonly sprBehindGrid: number;
  readonly grid: GridPerformance | null;
  readonly contrast: LinearContrast;
  /** Share of the primary energy behind the grid that enters the signal (of photons, counting). */
  readonly absorbedFraction: number;
  /**
   * Area at the detector over which noise is averaged: M²∬ΔS² dx dy / ΔS² of the central path. For
   * a thin vessel it is ⅔ d·L·M², for anything of one thickness its whole area times M². With it
   * SdNR = |detected contrast| / total relative noise.
   */
  readonly effectiveArea_mm2: number;
  /** SdNR² = c m² / (a m + e + s m²). */
  readonly coefficients: SdnrCoefficients;
  /** Static parts of s: structure and background, each as variance per mm² and mAs². */
  readonly structureVariance: number;
  readonly backgroundVariance: number;
}

export interface LinearContrast {
  /** (S_background − S_detail)/S_background of detected primary signal, central path. */
  readonly subject: number;
  /** ln(S_background/S_detail). */
  readonly logarithmic: number;
  /** Subject contrast for an ideal energy-fluence meter in front of the grid. */
  readonly energyFluenceSubject: number;
  readonly degradationFactor: number;
  readonly detected: number;
}

export interface SdnrCoefficients {
  /** M²(1 − glare)²∬ΔS² dx dy per mAs². */
  readonly c: number;
  /** Quantum variance per mm² and mAs, mask included. */
  readonly a: number;
  /** Electronic variance per mm², mask included. */
  readonly e: number;
  /** Variance per mm² and mAs² that no dose buys off. */
  readonly s: number;
}

const over = (value: number, divisor: number): number => (divisor > 0 ? value / divisor : 0);

/** Row · fluence with four running sums, which the processor can keep in flight together. */
const dot = (rows: Float64Array, row: number, fluence: Float64Array): number => {
  const channels = fluence.length;
  const from = row * channels;
  const whole = channels - (channels % 4);
  let s0 = 0;
  let s1 = 0;
  let s2 = 0;
  let s3 = 0;
  for (let i = 0; i < whole; i += 4) {
    const at = from + i;
    s0 += rows[at] * fluence[i];
    s1 += rows[at + 1] * fluence[i + 1];
    s2 += rows[at + 2] * fluence[i + 2];
    s3 += rows[at + 3] * fluence[i + 3];
  }
  for (let i = whole; i < channels; i++) s0 += rows[from + i] * fluence[i];
  return s0 + s1 + (s2 + s3);
};

/**
 * Reads a beam: contrast, scatter, kerma, noise and SdNR per mAs, by dot products only.
 *
 * SdNR² = M²(1 − glare)²∬ΔS² dx dy / σ₁² with
 * σ₁² = (1 + 1/n)(σ_q² + σ_e²) + r²[(f_s S_total)² + (f_b S_primary)²]·1 mm².
 *
 * @param fluence_per_mm2 primary of the plain stack (no detail) at the detector plane, before the
 * grid, photons per mm² and mAs on the channels of `weights`.
 * @returns finite numbers; where no photon arrives, ratios are 0.
 */
export const readBeam = (weights: ReadoutWeights, fluence_per_mm2: Float64Array): LinearReadout => {
  const { rows, pathAreas_mm2, chain } = weights;
  const { detail, noise, grid } = chain;
  const openPrimary = dot(rows, Row.openPrimary, fluence_per_mm2);
  const openScatter = dot(rows, Row.openScatter, fluence_per_mm2);
  const primary = dot(rows, Row.primary, fluence_per_mm2);
  const scatter = dot(rows, Row.scatter, fluence_per_mm2);
  const difference = dot(rows, Row.difference, fluence_per_mm2);
  const total = primary + scatter;
  const spr = over(openScatter, openPrimary);
  const sprBehindGrid = over(scatter, primary);

  const squareIntegral = squareIntegralOf(weights, fluence_per_mm2, difference);
  const magnified = detail.magnification ** 2;
  const kept = 1 - noise.glare_fraction;
  const residualSquare = noise.residual_fraction ** 2;
  const structureVariance = residualSquare * (noise.structure_fraction * total) ** 2;
  const backgroundVariance = residualSquare * (noise.background_fraction * primary) ** 2;
  const subject = over(difference, primary);
  const degradationFactor = 1 / (1 + sprBehindGrid);

  return {
    signalPrimary_per_mm2_per_mAs: primary,
    signalTotal_per_mm2_per_mAs: total,
    signalDifference_per_mm2_per_mAs: difference,
    detectorAirKermaPrimary_uGy_per_mAs: dot(rows, Row.primaryKerma, fluence_per_mm2),
    detectorAirKerma_uGy_per_mAs: dot(rows, Row.totalKerma, fluence_per_mm2),
    spr,
    sprBehindGrid,
    grid:
      grid &&
      gridPerformance(
        grid.measured?.primaryTransmission ?? over(primary, openPrimary),
        grid.measured?.scatterTransmission ?? over(scatter, openScatter),
        spr,
      ),
    contrast: {
      subject,
      logarithmic: primary > difference ? -Math.log1p(-subject) : 0,
      energyFluenceSubject: over(
        dot(rows, Row.energyFluenceLoss, fluence_per_mm2),
        dot(rows, Row.energyFluence, fluence_per_mm2),
      ),
      degradationFactor,
      detected: subject * degradationFactor * kept,
    },
    absorbedFraction: over(primary, dot(rows, Row.arriving, fluence_per_mm2)),
    effectiveArea_mm2:
      magnified *
      (difference === 0
        ? thinSignalArea_mm2(weights, pathAreas_mm2)
        : squareIntegral / (difference * difference)),
    coefficients: {
      c: magnified * kept * kept * squareIntegral,
      a: noise.maskFactor * dot(rows, Row.variance, fluence_per_mm2),
      e: noise.maskFactor * noise.electronicVariance_per_mm2,
      s: structureVariance + backgroundVariance,
    },
    structureVariance,
    backgroundVariance,
  };
};

/** ∬ΔS² dx dy at the detail, per mAs². */
const squareIntegralOf = (
  { rows, pathAreas_mm2, chain }: ReadoutWeights,
  fluence_per_mm2: Float64Array,
  central: number,
): number => {
  if (pathAreas_mm2.length === 0) return chain.detail.paths[0].area_mm2 * central * central;
  let sum = 0;
  for (let k = 0; k < pathAreas_mm2.length; k++) {
    const difference = dot(rows, Row.firstPath + k, fluence_per_mm2);
    sum += pathAreas_mm2[k] * difference * difference;
  }
  return sum;
};

/** The effective area a detail of vanishing contrast would have: signal in proportion to path. */
const thinSignalArea_mm2 = ({ chain }: ReadoutWeights, pathAreas_mm2: Float64Array): number => {
  const { central, paths } = chain.detail;
  if (pathAreas_mm2.length === 0) return paths[0].area_mm2;
  return paths.reduce(
    (sum, path) => sum + path.area_mm2 * (path.detail_mm / central.detail_mm) ** 2,
    0,
  );
};
