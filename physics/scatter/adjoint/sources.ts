import { cosines, ray, rows } from './directions.js';

/**
 * Responses solved together: what a photon of energy node i scores where it leaves the stack, where it
 * passes the skin scattered, or as energy left in one slab. `width` responses side by side.
 */
export interface AdjointSources {
  readonly width: number;
  /** Score at the exit face, `exit[(i · width + response) · rows + direction]`, the ray included. */
  readonly exit: Float64Array;
  /**
   * Score on passing the skin, up or down, `skin[(i · width + response) · rows + direction]`; 0 for the
   * ray, along which the primary comes.
   */
  readonly skin: Float64Array;
  /** Slab whose deposited energy is the response; −1 where it is none. */
  readonly slab: Int32Array;
}

/** Lets a response score air kerma per fluence (see `airKermaPerFluence`) of photons passing the skin. */
export function scoreAtSkin(
  { skin, width }: AdjointSources,
  response: number,
  airKerma: Float64Array,
): void {
  airKerma.forEach((kerma, i) => {
    for (let d = 0; d < ray; d++) skin[(i * width + response) * rows + d] = kerma / cosines[d];
  });
}

/** Lets a response score air kerma per fluence of photons at the exit, the ray included. */
export function scoreAtExit(
  { exit, width }: AdjointSources,
  response: number,
  airKerma: Float64Array,
): void {
  airKerma.forEach((kerma, i) => {
    for (let d = 0; d < rows; d++) exit[(i * width + response) * rows + d] = kerma / cosines[d];
  });
}

/** Sources of `width` responses that score nothing yet. */
export const emptySources = (energyCount: number, width: number): AdjointSources => ({
  width,
  exit: new Float64Array(energyCount * width * rows),
  skin: new Float64Array(energyCount * width * rows),
  slab: new Int32Array(width).fill(-1),
});
