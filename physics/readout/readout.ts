import type { GridPerformance } from '../results.js';
import { gridPerformance } from './grid-performance.js';
import { type ReadoutWeights, Row } from './readout-weights.js';
import { sumRows } from './sum-rows.js';

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
  const { pathAreas_mm2, chain } = weights;
  const { detail, noise, grid } = chain;
  const sums = sumRows(weights.rows, fluence_per_mm2, weights.sums);
  const openPrimary = sums[Row.openPrimary];
  const openScatter = sums[Row.openScatter];
  const primary = sums[Row.primary];
  const scatter = sums[Row.scatter];
  const difference = sums[Row.difference];
  const total = primary + scatter;
  const spr = over(openScatter, openPrimary);
  const sprBehindGrid = over(scatter, primary);

  const integral = squareIntegralOf(weights);
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
    detectorAirKermaPrimary_uGy_per_mAs: sums[Row.primaryKerma],
    detectorAirKerma_uGy_per_mAs: sums[Row.totalKerma],
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
      logarithmic: logarithmicContrast(primary, sums[Row.detail]),
      energyFluenceSubject: over(sums[Row.energyFluenceLoss], sums[Row.energyFluence]),
      degradationFactor,
      detected: subject * degradationFactor * kept,
    },
    absorbedFraction: over(primary, sums[Row.arriving]),
    effectiveArea_mm2:
      magnified *
      (difference === 0
        ? thinSignalArea_mm2(weights, pathAreas_mm2)
        : integral / (difference * difference)),
    coefficients: {
      c: magnified * kept * kept * integral,
      a: noise.maskFactor * sums[Row.variance],
      e: noise.maskFactor * noise.electronicVariance_per_mm2,
      s: structureVariance + backgroundVariance,
    },
    structureVariance,
    backgroundVariance,
  };
};

/** ln(background/detail); behind an opaque detail, of the smallest signal that can be written. */
const logarithmicContrast = (background: number, detail: number): number =>
  background > 0 ? Math.log(background) - Math.log(Math.max(detail, Number.MIN_VALUE)) : 0;

/** ∬ΔS² dx dy at the detail, per mAs², from the sums just made. */
const squareIntegralOf = ({ sums, pathAreas_mm2, chain }: ReadoutWeights): number => {
  if (pathAreas_mm2.length === 0) return chain.detail.paths[0].area_mm2 * sums[Row.difference] ** 2;
  let integral = 0;
  for (let k = 0; k < pathAreas_mm2.length; k++) {
    integral += pathAreas_mm2[k] * sums[Row.firstPath + k] ** 2;
  }
  return integral;
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
