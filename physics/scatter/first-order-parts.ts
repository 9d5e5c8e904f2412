import { kept } from '../../materials/kept.js';
import { type AngularShapes, angularShapes } from './angular.js';
import { sublayerPoints } from './first-order-points.js';
import type { ScatterGeometry } from './geometry.js';
import {
  joinEqualNeighbours,
  linearCoefficients,
  type Slab,
  type SlabCoefficients,
} from './slabs.js';

/** One slab with what lies above and below it, on the fine energies. */
export interface FirstOrderPart {
  readonly slab: Slab;
  readonly shapes: AngularShapes;
  readonly linear: SlabCoefficients;
  /** Optical thickness of everything above and below. */
  readonly above: Float64Array;
  readonly below: Float64Array;
  /** Quadrature points (see `sublayerPoints`) for an attenuation coefficient in 1/cm. */
  readonly pointsFor: (attenuation_per_cm: number) => Float64Array;
}

/** Sublayers are at most this thick in mean free paths. */
const sublayer_mfp = 1.5;
/** Thicker slabs pass next to nothing; their sublayers grow beyond 1.5 mean free paths. */
const mostSublayers = 24;

/** The slabs of a stack made ready for first-order quadrature in one geometry. */
export function firstOrderParts(
  slabs: readonly Slab[],
  geometry: ScatterGeometry,
  fine_keV: Float64Array,
): FirstOrderPart[] {
  const joined = joinEqualNeighbours(slabs);
  const linear = joined.map(({ material }) => linearCoefficients(material, fine_keV));
  const depth = (from: number, to: number) => {
    const sum = new Float64Array(fine_keV.length);
    for (let k = from; k < to; k++) {
      const { attenuation } = linear[k];
      for (let j = 0; j < sum.length; j++) sum[j] += attenuation[j] * joined[k].thickness_cm;
    }
    return sum;
  };
  return joined.map((slab, k) => {
    const height_cm = joined
      .slice(k + 1)
      .reduce((sum, { thickness_cm }) => sum + thickness_cm, geometry.gap_cm);
    return {
      slab,
      shapes: angularShapes(slab.material),
      linear: linear[k],
      above: depth(0, k),
      below: depth(k + 1, joined.length),
      pointsFor: pointsBySublayers(geometry, slab.thickness_cm, height_cm),
    };
  });
}

function pointsBySublayers(
  geometry: ScatterGeometry,
  thickness_cm: number,
  height_cm: number,
): FirstOrderPart['pointsFor'] {
  const made = new Map<number, Float64Array>();
  return (attenuation_per_cm) => {
    const wanted = Math.ceil((attenuation_per_cm * thickness_cm) / sublayer_mfp);
    const sublayers = Math.min(mostSublayers, Math.max(1, wanted));
    return kept(made, sublayers, () =>
      sublayerPoints(geometry, thickness_cm, height_cm, sublayers),
    );
  };
}
