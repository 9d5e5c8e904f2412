import type { Acquisition, Case } from '../case/schema.js';
import type { DetectorResponse } from './detector-response.js';
import { electronicVariance_per_mm2 } from './electronic-noise.js';

/** What besides the photons decides the noise of one displayed frame. */
export interface NoiseTerms {
  /** Signal units squared per mm². */
  readonly electronicVariance_per_mm2: number;
  /** Relative standard deviations in 1 mm² at the detector, white. */
  readonly structure_fraction: number;
  readonly background_fraction: number;
  /** 1 + 1/n with n mask frames averaged; 1 without a mask. */
  readonly maskFactor: number;
  /** Share of structure and background a mask leaves; 1 without a mask. */
  readonly residual_fraction: number;
  readonly glare_fraction: number;
}

/**
 * Noise terms of a case's detector and task in one acquisition. A mask is subtracted only in mode
 * `subtraction` with at least one mask frame. An ideal detector has neither electronic noise nor
 * structure; anatomical background belongs to the task and stays.
 */
export const noiseTerms = (
  c: Case,
  acquisition: Acquisition,
  response: DetectorResponse,
): NoiseTerms => {
  const { detector } = c.room;
  const masks = acquisition.mode === 'subtraction' ? acquisition.maskFrames : 0;
  return {
    electronicVariance_per_mm2: electronicVariance_per_mm2(detector, response),
    structure_fraction: response.isIdeal ? 0 : detector.structureNoise_fraction,
    background_fraction: c.task.backgroundNoise_fraction,
    maskFactor: masks > 0 ? 1 + 1 / masks : 1,
    residual_fraction: masks > 0 ? c.task.subtractionResidual_fraction : 1,
    glare_fraction: detector.glare_fraction,
  };
};
