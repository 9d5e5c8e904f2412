import { rows } from './directions.js';

/**
 * Responses solved together: what a photon of energy node i scores where it leaves the stack, where it
 * crosses the skin upward, or as energy left in one slab. `width` responses side by side.
 */
export interface AdjointSources {
  readonly width: number;
  /** Score at the exit face, `exit[(i · width + response) · rows + direction]`, the ray included. */
  readonly exit: Float64Array;
  /** Score on crossing the skin upward, `skin[(i · width + response) · rows + direction]`; the ray's is 0. */
  readonly skin: Float64Array;
  /** Slab whose deposited energy is the response; −1 where it is none. */
  readonly slab: Int32Array;
}

/** Sources of `width` responses that score nothing yet. */
export const emptySources = (energyCount: number, width: number): AdjointSources => ({
  width,
  exit: new Float64Array(energyCount * width * rows),
  skin: new Float64Array(energyCount * width * rows),
  slab: new Int32Array(width).fill(-1),
});
