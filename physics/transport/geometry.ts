import type { Insert } from './insert.js';

/**
 * Where matter is, for transport. All lengths in cm. z runs along the beam from 0 at the skin
 * (entrance face of the patient) to the detector; x and y across it, 0 on the axis.
 */
export interface TransportGeometry {
  /** Faces of the slabs, ascending; slab k lies between plane k and plane k + 1. */
  readonly planes_cm: Float64Array;
  /** Matter of every slab: its place in the matter tables. */
  readonly slabMatter: Int32Array;
  /** The plane at z = 0, where backscatter is scored. */
  readonly skinPlane: number;
  /** The perfectly absorbing plane that ends the world behind the stack. */
  readonly detector_cm: number;
  /** Finite sides and an insert; null for laterally infinite slabs alone. */
  readonly bounds: Bounds | null;
}

/** What breaks the translation invariance of the slabs. */
export interface Bounds {
  /** Half width and height of the slabs marked in `slabBounded`; infinite when they have no sides. */
  readonly halfWidth_cm: readonly [number, number];
  readonly slabBounded: Uint8Array;
  /** Matter beside the bounded slabs. */
  readonly outsideMatter: number;
  /** Photons further than this from the axis have left by the side. */
  readonly worldHalfWidth_cm: number;
  readonly insert: Insert | null;
}

/** Energy is tallied per slab, then beside the bounded slabs, then in the insert. */
export const regionCount = (geometry: TransportGeometry): number =>
  geometry.slabMatter.length + (geometry.bounds ? 2 : 0);

/** The slab that holds a depth; the last one at and beyond the end. */
export function slabOf(planes_cm: Float64Array, z: number): number {
  let slab = 0;
  while (slab < planes_cm.length - 2 && z >= planes_cm[slab + 1]) slab++;
  return slab;
}
