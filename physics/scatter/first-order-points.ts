import { gaussLegendre } from '../numeric/gauss-legendre.js';
import { type ScatterGeometry, shareInsideSquare } from './geometry.js';
import { anglePlace, scoreAngles } from './scores.js';

/** Numbers stored for one quadrature point, in the order of `sublayerPoints`. */
export const valuesPerPoint = 7;

const depths = gaussLegendre(3);
const angles = gaussLegendre(24);
/** Keeps the source above the slab it would otherwise touch. */
const leastSourceDistance_cm = 0.1;

/**
 * Quadrature points of first-order scatter in one slab: 3 depths per sublayer × 24 angles
 * β = β_max u², each as (depth left to the lower face, weight, secα − 1, secβ, cosθ, √sin(θ/2),
 * place among the score angles). The weight holds dz · 2π sinβ dβ · W · (SDD/D₁)² cos²α.
 */
export function sublayerPoints(
  geometry: ScatterGeometry,
  thickness_cm: number,
  height_cm: number,
  sublayers: number,
): Float64Array {
  const points = new Float64Array(sublayers * 3 * 24 * valuesPerPoint);
  const step = thickness_cm / sublayers;
  let at = 0;
  for (let sublayer = 0; sublayer < sublayers; sublayer++) {
    for (let z = 0; z < 3; z++) {
      const remaining = step * (sublayer + depths.nodes[z]);
      at = addAngles(
        points,
        at,
        geometry,
        remaining,
        height_cm + remaining,
        step * depths.weights[z],
      );
    }
  }
  return points;
}

function addAngles(
  points: Float64Array,
  start: number,
  { beam, sourceToDetector_cm, halfSide_cm }: ScatterGeometry,
  remaining: number,
  height: number,
  depthWeight: number,
): number {
  const isCone = beam === 'point';
  const sourceDistance = Math.max(leastSourceDistance_cm, sourceToDetector_cm - height);
  // The field's half side at the height of the point.
  const halfSide = isCone ? (halfSide_cm * sourceDistance) / sourceToDetector_cm : halfSide_cm;
  const betaMax = Math.atan((Math.SQRT2 * halfSide) / height);
  const concentration = isCone ? (sourceToDetector_cm / sourceDistance) ** 2 : 1;
  let at = start;
  for (let k = 0; k < angles.nodes.length; k++) {
    const u = angles.nodes[k];
    const beta = betaMax * u * u;
    const sine = Math.sin(beta);
    const cosine = Math.cos(beta);
    const radius = height * (sine / cosine);
    const tanAlpha = isCone ? radius / sourceDistance : 0;
    const secantAlpha = Math.sqrt(1 + tanAlpha * tanAlpha);
    const cosTheta = (cosine - tanAlpha * sine) / secantAlpha;
    const solidAngle = 2 * Math.PI * sine * (2 * betaMax * u * angles.weights[k]);
    points[at] = remaining;
    points[at + 1] =
      (depthWeight * solidAngle * shareInsideSquare(radius / halfSide) * concentration) /
      (secantAlpha * secantAlpha);
    points[at + 2] = secantAlpha - 1;
    points[at + 3] = 1 / cosine;
    points[at + 4] = cosTheta;
    points[at + 5] = ((1 - cosTheta) / 2) ** 0.25;
    points[at + 6] = Math.min(anglePlace(beta), scoreAngles - 1 - 1e-9);
    at += valuesPerPoint;
  }
  return at;
}
